// The two qualities that can be a version. They differ in light paths per pixel, never in size.
export const qualities = ["proof", "master"] as const;
export type Quality = (typeof qualities)[number];

/** Light paths per pixel along each axis, on a regular lattice inside the pixel. */
export const samplesPerAxis: Record<Quality, number> = { proof: 1, master: 2 };
