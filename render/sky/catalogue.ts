// The star catalogue in our own compact form. Little-endian: "RWST", version, count, then twelve bytes a star: right
// ascension and declination in 1e-4 degrees (int32), V magnitude in 1e-2 (int16), B−V in 1e-3 (int16).

export interface Star {
  raDeg: number;
  decDeg: number;
  /** Apparent V magnitude. */
  magnitude: number;
  /** Colour index B−V. */
  colourIndex: number;
}

const magic = 0x54535752;
const version = 1;
const headerBytes = 12;
const starBytes = 12;

export function encodeCatalogue(stars: readonly Star[]): Uint8Array {
  const bytes = new Uint8Array(headerBytes + starBytes * stars.length);
  const view = new DataView(bytes.buffer);
  [magic, version, stars.length].forEach((word, i) => view.setUint32(4 * i, word, true));
  stars.forEach((star, i) => {
    const at = headerBytes + starBytes * i;
    view.setInt32(at, Math.round(star.raDeg * 1e4), true);
    view.setInt32(at + 4, Math.round(star.decDeg * 1e4), true);
    view.setInt16(at + 8, Math.round(star.magnitude * 1e2), true);
    view.setInt16(at + 10, Math.round(star.colourIndex * 1e3), true);
  });
  return bytes;
}

/** The stars of an encoded catalogue. Throws a RangeError on bytes that are none, or are cut short. */
export function decodeCatalogue(bytes: Uint8Array): Star[] {
  const view = new DataView(bytes.buffer, bytes.byteOffset, bytes.byteLength);
  if (bytes.length < headerBytes || view.getUint32(0, true) !== magic)
    throw new RangeError("This is no star catalogue of ours.");
  if (view.getUint32(4, true) !== version)
    throw new RangeError(
      `This star catalogue is of version ${view.getUint32(4, true)}; ${version} is read here.`,
    );
  const count = view.getUint32(8, true);
  if (bytes.length !== headerBytes + starBytes * count)
    throw new RangeError("The star catalogue is cut short.");
  return Array.from({ length: count }, (_, i) => {
    const at = headerBytes + starBytes * i;
    return {
      raDeg: view.getInt32(at, true) / 1e4,
      decDeg: view.getInt32(at + 4, true) / 1e4,
      magnitude: view.getInt16(at + 8, true) / 1e2,
      colourIndex: view.getInt16(at + 10, true) / 1e3,
    };
  });
}

/**
 * Temperature in K of the black body with colour index B−V, 4600 (1/(0.92 (B−V) + 1.7) + 1/(0.92 (B−V) + 0.62))
 * (Ballesteros 2012, EPL 97, 34008, eq. 14). B−V from −0.4 (37 000 K) to 5.5; a bluer index counts as −0.4.
 */
export function colourTemperature(colourIndex: number): number {
  const scaled = 0.92 * Math.max(colourIndex, -0.4);
  return 4600 * (1 / (scaled + 1.7) + 1 / (scaled + 0.62));
}
