export interface TextPart {
  text: string;
  /** Where the part leads, when it is an address of the web. */
  href?: string;
}

/** A plain text in parts, its web addresses apart. A full stop or bracket after an address is not part of it. */
export function splitLinks(text: string): TextPart[] {
  return text
    .split(/(https?:\/\/[^\s<>"]*[^\s<>".,;:!?)\]])/)
    .filter((part) => part !== "")
    .map((part) => (/^https?:\/\//.test(part) ? { text: part, href: part } : { text: part }));
}
