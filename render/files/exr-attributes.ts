// OpenEXR header attributes as bytes: name, type, size, value, all little-endian (OpenEXR file layout, 2.0).

export type ExrAttribute =
  | { type: "string"; value: string }
  | { type: "int"; value: number }
  | { type: "float"; value: number }
  | { type: "double"; value: number }
  | { type: "rational"; value: readonly [numerator: number, denominator: number] }
  | { type: "v2f"; value: readonly [number, number] }
  | { type: "box2i"; value: readonly [xMin: number, yMin: number, xMax: number, yMax: number] }
  | { type: "chromaticities"; value: readonly number[] }
  | { type: "compression" | "lineOrder" | "envmap"; value: number }
  | { type: "chlist"; value: readonly string[] };

export type ExrHeader = Record<string, ExrAttribute>;

const text = new TextEncoder();

/** The header's bytes, attributes in the order of the record, closed by a zero byte. */
export function encodeHeader(header: ExrHeader): Uint8Array {
  const parts: Uint8Array[] = [];
  for (const [name, attribute] of Object.entries(header)) {
    if (name.length > 31) throw new RangeError(`The attribute name ${name} is longer than 31 letters.`);
    const value = encodeValue(attribute);
    parts.push(text.encode(`${name}\0${attribute.type}\0`), int32s(value.length), value);
  }
  parts.push(Uint8Array.of(0));
  return joinBytes(parts);
}

function encodeValue(attribute: ExrAttribute): Uint8Array {
  switch (attribute.type) {
    case "string":
      return text.encode(attribute.value);
    case "int":
      return int32s(attribute.value);
    case "rational":
    case "box2i":
      return int32s(...attribute.value);
    case "float":
      return bytesOf(4, (view) => view.setFloat32(0, attribute.value, true));
    case "double":
      return bytesOf(8, (view) => view.setFloat64(0, attribute.value, true));
    case "v2f":
    case "chromaticities":
      return bytesOf(4 * attribute.value.length, (view) =>
        attribute.value.forEach((number, i) => view.setFloat32(4 * i, number, true)),
      );
    case "compression":
    case "lineOrder":
    case "envmap":
      return Uint8Array.of(attribute.value);
    case "chlist":
      return encodeChannels(attribute.value);
  }
}

/** Half-float channels (pixel type 1), linear flag 0, sampled at every pixel. */
function encodeChannels(names: readonly string[]): Uint8Array {
  const halfChannel = (name: string) => joinBytes([text.encode(`${name}\0`), int32s(1, 0, 1, 1)]);
  return joinBytes([...names.map(halfChannel), Uint8Array.of(0)]);
}

export const int32s = (...values: number[]) =>
  bytesOf(4 * values.length, (view) => values.forEach((value, i) => view.setInt32(4 * i, value, true)));

function bytesOf(length: number, fill: (view: DataView) => void): Uint8Array {
  const bytes = new Uint8Array(length);
  fill(new DataView(bytes.buffer));
  return bytes;
}

export function joinBytes(parts: readonly Uint8Array[]): Uint8Array {
  const joined = new Uint8Array(parts.reduce((sum, part) => sum + part.length, 0));
  let at = 0;
  for (const part of parts) {
    joined.set(part, at);
    at += part.length;
  }
  return joined;
}
