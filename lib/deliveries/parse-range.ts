// One range of bytes, as a browser or curl asks for it when it resumes (RFC 9110 §14).
export interface ByteSpan {
  start: number;
  end: number;
}

/** The part asked for; "whole" when none is, or when it cannot be honoured; "beyond" when nothing of it exists. */
export function parseRange(header: string | null, size: number): ByteSpan | "whole" | "beyond" {
  const match = /^bytes=(\d*)-(\d*)$/.exec(header?.trim() ?? "");
  const [, from, to] = match ?? [];
  if (!match || (from === "" && to === "")) return "whole";
  if (from === "") {
    const length = Math.min(Number(to), size);
    return length === 0 ? "beyond" : { start: size - length, end: size - 1 };
  }
  const start = Number(from);
  const end = to === "" ? size - 1 : Math.min(Number(to), size - 1);
  if (start >= size) return "beyond";
  return start > end ? "whole" : { start, end };
}
