// Light paths of some rows of a frame, one value per sample: traced once, shaded as often as the look changes.

/** How a sample's light path ended. */
export const sampleFates = { captured: 0, disk: 1, sky: 2, unresolved: 3, outsideLens: 4 } as const;

export interface PathPlanes {
  width: number;
  rows: number;
  fate: Uint8Array;
  /** Equatorial crossings before the one that emits: 0 direct, 1 once round the back, … */
  order: Uint8Array;
  /** Radius in M of the emitting point on the disk. */
  radius: Float64Array;
  /** Observed over emitted frequency, of the disk or of the sky at rest far away. */
  shift: Float64Array;
  /** Unit vector in world axes of where the light came from, three numbers a sample. */
  sky: Float64Array;
}

export function createPlanes(width: number, rows: number): PathPlanes {
  const count = width * rows;
  return {
    width,
    rows,
    fate: new Uint8Array(count),
    order: new Uint8Array(count),
    radius: new Float64Array(count),
    shift: new Float64Array(count),
    sky: new Float64Array(3 * count),
  };
}
