/** A SHA-256 in groups of eight figures; short: the first two groups and the last. */
export function groupDigest(digest: string, short = false): string[] {
  const groups = digest.match(/.{1,8}/g) ?? [];
  return short && groups.length > 3 ? [...groups.slice(0, 2), "…", ...groups.slice(-1)] : groups;
}

export interface DigestProps {
  digest: string;
  /** One line: the first two groups and the last. */
  short?: boolean;
  /** Underline the last eight figures, which a signature repeats. */
  markLast?: boolean;
  className?: string;
}

/** The digest of a version, as it is shown wherever the version is named. */
export function Digest({ digest, short, markLast, className = "" }: DigestProps) {
  const groups = groupDigest(digest, short);
  if (short)
    return (
      <span title={digest} className={`type-figure text-text ${className}`}>
        {groups.join(" ")}
      </span>
    );
  return (
    <span
      className={`type-figure grid grid-cols-[repeat(4,max-content)] justify-between gap-x-12 text-text sm:type-digest ${className}`}
    >
      {groups.map((group, index) => (
        <span
          key={index}
          className={
            markLast && index === groups.length - 1 ? "border-b border-text font-semibold text-bright" : ""
          }
        >
          {group}{" "}
        </span>
      ))}
    </span>
  );
}
