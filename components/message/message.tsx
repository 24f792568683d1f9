import type { ReactNode } from "react";

export type MessageKind = "news" | "work" | "settled";

const bars: Record<MessageKind, string> = {
  news: "border-l-text",
  work: "border-l-ember",
  settled: "border-l-ice",
};

export interface MessageProps {
  /** news: something happens; work: something is asked or went wrong; settled: something is done. */
  kind?: MessageKind;
  /** Leave out the frame, as for a caution that stands in a text. */
  bare?: boolean;
  /** Read aloud when it appears: at once for work, when convenient for the rest. False for one that was always there. */
  announce?: boolean;
  className?: string;
  children: ReactNode;
}

/** What happened, why, and what to do, in one or two sentences; put a TextAction after them. */
export function Message({ kind = "news", bare, announce = true, className = "", children }: MessageProps) {
  const role = announce ? (kind === "work" ? "alert" : "status") : undefined;
  const frame = bare
    ? `border-l-3 pl-12 ${bars[kind]}`
    : `min-h-38 border border-l-4 border-edge bg-raised px-16 py-9 ${bars[kind]}`;
  return (
    <div role={role} className={`type-label text-text ${frame} ${className}`}>
      {children}
    </div>
  );
}
