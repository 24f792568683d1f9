// What a download's bytes flow through. A file that is not what was signed never arrives whole.
import { createHash } from "node:crypto";
import { Transform } from "node:stream";

/** A stored file whose bytes are not those that were signed. */
export class DamagedFile extends Error {
  constructor(readonly path: string) {
    super(`The stored bytes of ${path} are not those that were signed.`);
    this.name = "DamagedFile";
  }
}

/** Passes bytes on and holds the last piece back until the whole has proved to be what its checksum promises. */
export function checkBytes(path: string, sha256: string): Transform {
  const hash = createHash("sha256");
  let held: Buffer | undefined;
  return new Transform({
    transform(piece: Buffer, _encoding, done) {
      hash.update(piece);
      const ready = held;
      held = piece;
      done(null, ready);
    },
    flush(done) {
      if (hash.digest("hex") === sha256) done(null, held);
      else done(new DamagedFile(path));
    },
  });
}

/** Passes on the bytes from `start` to `end`, both included, the last piece only once everything before it has ended well. */
export function sliceBytes(start: number, end: number): Transform {
  let offset = 0;
  let held: Buffer | undefined;
  return new Transform({
    transform(piece: Buffer, _encoding, done) {
      const from = Math.max(0, start - offset);
      const to = Math.min(piece.length, end + 1 - offset);
      offset += piece.length;
      if (from >= to) return done();
      const ready = held;
      held = piece.subarray(from, to);
      done(null, ready);
    },
    flush(done) {
      done(null, held);
    },
  });
}

/** Counts the bytes that pass, and does not end before what `atEnd` does with their number is done. */
export function countBytes(atEnd: (bytes: number) => Promise<void>): Transform {
  let bytes = 0;
  return new Transform({
    transform(piece: Buffer, _encoding, done) {
      bytes += piece.length;
      done(null, piece);
    },
    flush(done) {
      atEnd(bytes).then(() => done(), done);
    },
  });
}
