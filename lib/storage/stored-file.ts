// Files by the SHA-256 of their content: the same bytes are kept once, and a name can never come to mean other bytes.
import type { Readable } from "node:stream";

export interface StoredFile {
  sha256: string;
  bytes: number;
}

/** Bytes from `start` to `end`, both included, as HTTP counts them. */
export interface ByteRange {
  start: number;
  end: number;
}

export interface Storage {
  /** Keeps the content and says under which name. Putting the same content again changes nothing. */
  put(content: Uint8Array | Readable): Promise<StoredFile>;
  /** The content, or a part of it; refused in words when it is not kept. */
  open(sha256: string, range?: ByteRange): Promise<Readable>;
  /** How many bytes are kept under the name; undefined when none are. */
  size(sha256: string): Promise<number | undefined>;
  /** Reads everything and says whether it still is what its name promises. */
  verify(sha256: string): Promise<boolean>;
}
