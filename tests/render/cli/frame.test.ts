// The command line's `frame`, run as a pipeline runs it.
import { spawnSync } from "node:child_process";
import { createHash } from "node:crypto";
import { mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { fileURLToPath } from "node:url";
import { afterAll, describe, expect, it } from "vitest";
import { kernelVersion } from "@/render/kernel-version";
import { canonicalJson } from "@/render/scene/canonical";
import { readExr } from "../files/read-exr";
import { smallSetup } from "../shade/small-setup";

const root = fileURLToPath(new URL("../../..", import.meta.url));
const folder = mkdtempSync(path.join(tmpdir(), "frames-"));
afterAll(() => rmSync(folder, { recursive: true }));

const setup = smallSetup({ time: { first: 1, last: 24 }, picture: { width: 32, height: 18 } });
const setupFile = path.join(folder, "setup.json");
writeFileSync(setupFile, JSON.stringify(setup));

function frame(...args: string[]) {
  const ended = spawnSync(process.execPath, ["--import", "tsx", "render/cli.ts", "frame", ...args], {
    cwd: root,
    encoding: "utf8",
  });
  return { ...ended, lines: ended.stderr.trimEnd().split("\n") };
}

describe("frame on the command line", () => {
  const out = path.join(folder, "made", "here");

  it("writes the asked frames as OpenEXR and PNG, whole, under sorted names, and says nothing", () => {
    const { status, stdout, stderr } = frame(
      setupFile,
      "--out",
      out,
      "--frames",
      "2-3",
      "--colour",
      "acescg",
    );
    expect({ status, stdout, stderr }).toEqual({ status: 0, stdout: "", stderr: "" });
    expect(readdirSync(out).sort()).toEqual([
      "frame_0002.exr",
      "frame_0002.png",
      "frame_0003.exr",
      "frame_0003.png",
    ]);
  });

  it("writes the setup's digest, the kernel's version and the frame's number into them", () => {
    const { attributes } = readExr(readFileSync(path.join(out, "frame_0003.exr")));
    const digest = createHash("sha256").update(canonicalJson(setup)).digest("hex");
    expect(attributes.get("ringwright:setupDigest")!.value.toString()).toBe(digest);
    expect(attributes.get("ringwright:kernel")!.value.toString()).toBe(kernelVersion);
    expect(attributes.get("imageCounter")!.value.readInt32LE()).toBe(3);
  });

  it("writes the same bytes in another process", () => {
    const again = path.join(folder, "again");
    expect(frame(setupFile, "--out", again, "--frames", "2", "--colour", "acescg").status).toBe(0);
    for (const name of ["frame_0002.exr", "frame_0002.png"])
      expect(readFileSync(path.join(again, name)).equals(readFileSync(path.join(out, name)))).toBe(true);
  });
});

describe("frame on the command line refuses, in one line each,", () => {
  const out = path.join(folder, "refused");
  const broken = path.join(folder, "broken.json");
  writeFileSync(broken, JSON.stringify({ ...setup, hole: { massSolar: 1, spin: 2 } }));
  const text = path.join(folder, "text.json");
  writeFileSync(text, "no setup");

  const refused: [string, string[], RegExp[]][] = [
    [
      "a missing setup",
      [path.join(folder, "none.json"), "--out", out],
      [/none\.json: The setup cannot be read \(ENOENT\)/],
    ],
    ["a setup that is not JSON", [text, "--out", out], [/text\.json: This is not JSON/]],
    [
      "a setup with values out of range",
      [broken, "--out", out],
      [
        /hole\.massSolar: Must be between 3 and 20,000,000,000 solar masses/,
        /hole\.spin: Must be between 0 and 0\.9999/,
      ],
    ],
    [
      "frames the setup does not have",
      [setupFile, "--out", out, "--frames", "20-30"],
      [/has the frames 1 to 24/],
    ],
    [
      "a range that is none",
      [setupFile, "--out", out, "--frames", "5-2"],
      [/Give one frame, such as 1001, or a range/],
    ],
    [
      "an unknown quality",
      [setupFile, "--out", out, "--quality", "best"],
      [/--quality best: Must be one of proof, master/],
    ],
    ["no folder", [setupFile], [/Say with --out DIR/]],
    ["no setup at all", ["--out", out], [/Name one setup file/]],
    ["an unknown option", [setupFile, "--out", out, "--size", "9"], [/Unknown option '--size'/]],
  ];

  it.each(refused)("%s", (_, args, expected) => {
    const { status, stdout, lines } = frame(...args);
    expect(status).toBe(1);
    expect(stdout).toBe("");
    expect(lines).toHaveLength(expected.length);
    expected.forEach((pattern, i) => expect(lines[i]).toMatch(pattern));
  });

  it("a folder that cannot be made, and leaves nothing behind", () => {
    const { status, lines } = frame(setupFile, "--out", path.join(setupFile, "inside"));
    expect(status).toBe(1);
    expect(lines).toHaveLength(1);
    expect(lines[0]).toMatch(/--out .*inside: The folder cannot be made \(E\w+\)/);
    expect(readdirSync(folder).filter((name) => name.endsWith(".partial"))).toEqual([]);
  });

  it("a command that there is none of", () => {
    const args = ["--import", "tsx", "render/cli.ts", "paint"];
    const { status, stderr } = spawnSync(process.execPath, args, { cwd: root, encoding: "utf8" });
    expect(status).toBe(1);
    expect(stderr).toMatch(/^paint: No such command\.\nUse: /);
  });
});
