/** What the command line refuses: one line each, saying what, where and what to do. */
export class Refusal extends Error {
  constructor(readonly lines: readonly string[]) {
    super(lines.join("\n"));
  }
}
