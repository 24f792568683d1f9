// The command line's `paths`, run as a pipeline runs it, on the published rays (section 6).
import { spawnSync } from "node:child_process";
import { fileURLToPath } from "node:url";
import { describe, expect, it } from "vitest";
import { entriesOf, expectWithin, nameOf, type Entry } from "../published/entries";

const root = fileURLToPath(new URL("../../..", import.meta.url));

function paths(input: string) {
  const args = ["--import", "tsx", "render/cli.ts", "paths"];
  return spawnSync(process.execPath, args, { cwd: root, input, encoding: "utf8" });
}

const entries = entriesOf(6);
type Fields = Record<string, number | string>;

function expectFields(entry: Entry, place: string, actual: Fields, expected: Fields, condition: number) {
  for (const [name, value] of Object.entries(expected)) {
    if (name.startsWith("condition") || name === "crossings") continue;
    if (typeof value === "string") expect(actual[name], `${entry.id} ${name}`).toBe(value);
    else expectWithin(entry, place + name, Number(actual[name]), value, condition);
  }
  const known = new Set([...Object.keys(expected), "id"]);
  expect(Object.keys(actual).filter((name) => !known.has(name))).toEqual([]);
}

describe("paths on the command line", () => {
  const rays = entries.map(({ id, inputs }) => ({ id, ...inputs }));
  const ended = paths(JSON.stringify(rays));
  const answers = JSON.parse(ended.stdout) as (Fields & { crossings: Fields[] })[];

  it("answers every ray, in order, with its id, and says nothing else", () => {
    expect(ended.status).toBe(0);
    expect(ended.stderr).toBe("");
    expect(answers.map((answer) => answer.id)).toEqual(entries.map((entry) => entry.id));
  });

  it.each(entries.map((entry, i) => [nameOf(entry), entry, i] as const))("%s", (_, entry, i) => {
    const expected = entry.expected as unknown as Fields & { crossings: Fields[] };
    const answer = answers[i]!;
    expectFields(entry, "", answer, expected, Number(expected.condition_inf ?? 1));
    expect(answer.crossings).toHaveLength(expected.crossings.length);
    expected.crossings.forEach((crossing, k) =>
      expectFields(entry, `crossing ${k} `, answer.crossings[k]!, crossing, Number(crossing.condition)),
    );
  });

  it("needs no id and gives none back", () => {
    const [answer] = JSON.parse(paths(JSON.stringify([entries[0]!.inputs])).stdout) as object[];
    expect(answer).not.toHaveProperty("id");
  });
});

describe("paths on the command line refuses, in one line each,", () => {
  const good = { ...entries[0]!.inputs };
  const refused: [string, string, string[]][] = [
    [
      "an empty input",
      "",
      ["rays: Nothing came on the standard input. Give an array of rays: paths < rays.json"],
    ],
    ["what is not an array", "{}", ["rays: Must be an array of rays."]],
    [
      "a spin and a sign out of range",
      JSON.stringify([good, { ...good, a: 1.5, sign_pr_at_observer: 0 }]),
      ["rays[1].a: Must be from 0 to 0.9999.", "rays[1].sign_pr_at_observer: Must be 1 or -1."],
    ],
    [
      "an observer inside the horizon",
      JSON.stringify([{ ...good, a: 0, r_obs: 1.5 }]),
      ["rays[0].r_obs: The observer is inside the horizon, 2 M at this spin."],
    ],
    [
      "light that cannot be there",
      JSON.stringify([{ ...good, a: 0, r_obs: 10, cos_theta_obs: 0, lambda: 100, eta: 1e4 }]),
      ["rays[0].eta: No light of these constants passes this radius: R(r) is negative there."],
    ],
  ];

  it.each(refused)("%s", (_, input, lines) => {
    const { status, stdout, stderr } = paths(input);
    expect(status).toBe(1);
    expect(stdout).toBe("");
    expect(stderr.trimEnd().split("\n")).toEqual(lines);
  });

  it("text that is not JSON", () => {
    const { status, stderr } = paths("[{");
    expect(status).toBe(1);
    expect(stderr.trimEnd().split("\n")).toHaveLength(1);
    expect(stderr).toMatch(/^rays: This is not JSON: /);
  });
});
