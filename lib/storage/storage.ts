// Files by the SHA-256 of their content: the same bytes are kept once, and a name can never come to mean other bytes.
import type { Readable } from "node:stream";
import { environment } from "../environment";
import { bucketStorage } from "./bucket";
import { folderStorage } from "./folder";

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

let chosen: Storage | undefined;

/** The process's storage: an S3 bucket when one is configured, else the local folder. */
export function storage(): Storage {
  return (chosen ??= choose());
}

function choose(): Storage {
  const { S3_BUCKET: bucket, S3_ENDPOINT: endpoint, S3_REGION: region, STORAGE_DIR: folder } = environment();
  return bucket ? bucketStorage({ bucket, endpoint, region }) : folderStorage(folder);
}
