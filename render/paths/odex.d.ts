// What of the package odex is used here. It ships its own source, which is not strict TypeScript, so tsconfig's `paths`
// shows the compiler this file; at run time the package itself is what is imported.
export class Solver {
  constructor(dimension: number);
  maxSteps: number;
  initialStepSize: number;
  maxExtrapolationColumns: number;
  relativeTolerance: number;
  absoluteTolerance: number;
  solve(
    derivative: (x: number, y: number[]) => number[],
    x: number,
    y: number[],
    xEnd: number,
    afterStep?: (count: number, xOld: number, x: number, y: number[]) => boolean | void,
  ): { y: number[]; outcome: number };
}
