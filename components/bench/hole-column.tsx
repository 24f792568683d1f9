import { Field } from "../field/field";
import { Column } from "./column";
import type { Slip } from "./use-slip";

export function HoleColumn({ slip: { figure, consequences } }: { slip: Slip }) {
  return (
    <Column title="Hole">
      <Field label="mass" unit="M☉" consequence={consequences.mass} {...figure("hole.massSolar")} />
      <Field label="spin a" consequence={consequences.spin} {...figure("hole.spin")} />
    </Column>
  );
}
