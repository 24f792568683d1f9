/** A frame that cannot be finished by trying again; the message is shown to people. */
export class FrameFailure extends Error {
  constructor(message: string, cause?: unknown) {
    super(message, { cause });
    this.name = "FrameFailure";
  }
}

const storageWords: Record<string, string> = {
  ENOSPC: "There is no room left where finished frames are kept. Make room, then resume.",
  EDQUOT: "The quota where finished frames are kept is used up. Make room, then resume.",
  EROFS: "The place where finished frames are kept can only be read. Make it writable, then resume.",
  EACCES: "The worker may not write where finished frames are kept. Give it the right to, then resume.",
};

/** Puts words to a storage error that no retry mends; any other is passed on, for the queue to try again. */
export function storageFailure(error: unknown): unknown {
  const words = storageWords[(error as NodeJS.ErrnoException).code ?? ""];
  return words ? new FrameFailure(words, error) : error;
}
