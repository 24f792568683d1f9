const width = 78;

/** A paragraph as lines of at most 78 characters; a longer word stands alone. */
export function wrapText(text: string, indent = ""): string {
  const paragraphs = text.split("\n").map((line) => wrapLine(line, indent));
  return paragraphs.join("\n");
}

function wrapLine(text: string, indent: string): string {
  const lines: string[] = [];
  let line = indent;
  for (const word of text.split(/\s+/).filter(Boolean)) {
    const longer = line === indent ? indent + word : `${line} ${word}`;
    if (longer.length > width && line !== indent) {
      lines.push(line);
      line = indent + word;
    } else {
      line = longer;
    }
  }
  return [...lines, line].join("\n");
}
