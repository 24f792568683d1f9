import {
  GetObjectCommand,
  HeadObjectCommand,
  NotFound,
  NoSuchKey,
  PutObjectCommand,
  S3Client,
} from "@aws-sdk/client-s3";
import { randomUUID } from "node:crypto";
import { createReadStream } from "node:fs";
import { rm } from "node:fs/promises";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { Readable } from "node:stream";
import { checkName, hashOf, missing, spool } from "./content";
import type { ByteRange, Storage, StoredFile } from "./stored-file";

export interface Bucket {
  bucket: string;
  region: string;
  /** Another server than Amazon's; addressed by path, since such servers seldom answer to bucket names as hosts. */
  endpoint?: string;
  /** Left out, the SDK finds them in its usual places. */
  credentials?: { accessKeyId: string; secretAccessKey: string };
}

/** An S3 bucket. S3 shows an object only when its upload is complete, so nothing half-written is ever seen. */
export function bucketStorage({ bucket, endpoint, ...rest }: Bucket): Storage {
  const client = new S3Client({
    ...rest,
    ...(endpoint && { endpoint, forcePathStyle: true }),
    // Other servers than Amazon's do not know the newer trailing checksums; our names are checksums themselves.
    requestChecksumCalculation: "WHEN_REQUIRED",
    responseChecksumValidation: "WHEN_REQUIRED",
  });
  const at = (sha256: string) => ({
    Bucket: bucket,
    Key: `${checkName(sha256).slice(0, 2)}/${sha256.slice(2)}`,
  });
  const size = async (sha256: string) => {
    const head = await client.send(new HeadObjectCommand(at(sha256))).catch(ignoreMissing);
    return head?.ContentLength;
  };
  const openObject = async (sha256: string, range?: ByteRange): Promise<Readable> => {
    const Range = range && `bytes=${range.start}-${range.end}`;
    const object = await client.send(new GetObjectCommand({ ...at(sha256), Range })).catch(ignoreMissing);
    if (!(object?.Body instanceof Readable)) throw missing(sha256);
    return object.Body;
  };
  return {
    put: (content) => putObject(client, at, size, content),
    open: openObject,
    size,
    verify: async (sha256) =>
      (await size(sha256)) !== undefined && (await hashOf(await openObject(sha256))) === sha256,
  };
}

// The name is known only at the end, so the content is first written to a file of our own.
async function putObject(
  client: S3Client,
  at: (sha256: string) => { Bucket: string; Key: string },
  size: (sha256: string) => Promise<number | undefined>,
  content: Uint8Array | Readable,
): Promise<StoredFile> {
  const temporary = join(tmpdir(), `ringwright-${randomUUID()}`);
  try {
    const stored = await spool(content, temporary);
    if ((await size(stored.sha256)) === stored.bytes) return stored;
    const Body = createReadStream(temporary);
    await client.send(new PutObjectCommand({ ...at(stored.sha256), Body, ContentLength: stored.bytes }));
    return stored;
  } finally {
    await rm(temporary, { force: true });
  }
}

function ignoreMissing(error: unknown): undefined {
  if (error instanceof NotFound || error instanceof NoSuchKey) return;
  throw error;
}
