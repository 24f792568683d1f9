// IEEE 754 binary16, OpenEXR's HALF. Largest finite value 65504; whole numbers are exact to 2048.

const asFloat = new Float32Array(1);
const asBits = new Uint32Array(asFloat.buffer);

/** The 16 bits of the half nearest to the value, ties to even; too large becomes infinity, NaN stays NaN. */
export function halfBits(value: number): number {
  asFloat[0] = value;
  const bits = asBits[0]!;
  const sign = (bits >>> 16) & 0x8000;
  const magnitude = bits & 0x7fffffff;
  if (magnitude >= 0x7f800000) return sign | (magnitude > 0x7f800000 ? 0x7e00 : 0x7c00);
  if (magnitude >= 0x477ff000) return sign | 0x7c00;
  if (magnitude >= 0x38800000) return sign | roundShift(magnitude - 0x38000000, 13);
  if (magnitude < 0x33000000) return sign;
  const shift = 126 - (magnitude >>> 23);
  return sign | roundShift((magnitude & 0x7fffff) | 0x800000, shift);
}

function roundShift(value: number, shift: number): number {
  const half = 1 << (shift - 1);
  const rest = value & ((1 << shift) - 1);
  const kept = value >>> shift;
  return rest > half || (rest === half && kept & 1) ? kept + 1 : kept;
}
