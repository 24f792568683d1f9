/** The engine's name in files and digests. It changes whenever any pixel of any setup may change. */
export const kernelVersion = "p1.0";
