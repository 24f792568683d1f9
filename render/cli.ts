// The command line for pipelines: npm run -s render -- <command>. Answers go to the standard output, refusals and
// progress to the standard error.
import { text } from "node:stream/consumers";
import { parseArgs } from "node:util";
import { renderFrames } from "./hosts/cli/frame-command";
import { answerRays } from "./hosts/cli/paths-command";
import { Refusal } from "./hosts/cli/refusal";
import { closePool } from "./hosts/node/pool";
import { colourSpaces, type ColourSpace } from "./shade/colour-spaces";
import { displayCurves, type DisplayCurve } from "./shade/transfer";
import { qualities, type Quality } from "./shade/quality";

const usage = `Use: render paths < rays.json
     render frame setup.json --out DIR [--quality proof|master] [--frames 1001-1024] [--colour rec709|acescg] [--curve none|reinhard]`;

function chosen<Choice extends string>(option: string, value: string, choices: readonly Choice[]): Choice {
  const choice = choices.find((candidate) => candidate === value);
  if (!choice) throw new Refusal([`--${option} ${value}: Must be one of ${choices.join(", ")}.`]);
  return choice;
}

async function frame(args: string[], signal: AbortSignal): Promise<void> {
  const { values, positionals } = parseArgs({
    args,
    allowPositionals: true,
    options: {
      out: { type: "string" },
      frames: { type: "string" },
      quality: { type: "string", default: "proof" satisfies Quality },
      colour: { type: "string", default: "rec709" satisfies ColourSpace },
      curve: { type: "string", default: "none" satisfies DisplayCurve },
    },
  });
  const [setupFile, ...rest] = positionals;
  if (!setupFile || rest.length > 0)
    throw new Refusal([`frame: Name one setup file. ${usage.split("\n")[1]!.trim()}`]);
  if (!values.out) throw new Refusal(["frame: Say with --out DIR where the files should go."]);
  const progress = process.stderr.isTTY;
  await renderFrames({
    setupFile,
    out: values.out,
    frames: values.frames,
    quality: chosen("quality", values.quality, qualities),
    colourSpace: chosen("colour", values.colour, colourSpaces),
    displayCurve: chosen("curve", values.curve, displayCurves),
    signal,
    report: (line) => progress && process.stderr.write(`\r${line}\u001b[K`),
  });
  if (progress) process.stderr.write("\n");
}

async function paths(args: string[]): Promise<void> {
  parseArgs({ args, options: {} });
  process.stdout.write(answerRays(await text(process.stdin)));
}

async function run([command, ...args]: string[]): Promise<void> {
  const interrupted = new AbortController();
  process.once("SIGINT", () =>
    interrupted.abort(new Refusal(["Interrupted. Frames written so far are whole."])),
  );
  if (command === "paths") await paths(args);
  else if (command === "frame") await frame(args, interrupted.signal);
  else if (command === "--help" || command === "help") process.stdout.write(`${usage}\n`);
  else throw new Refusal([`${command ?? "render"}: No such command.`, ...usage.split("\n")]);
}

try {
  await run(process.argv.slice(2));
} catch (error) {
  const lines =
    error instanceof Refusal ? error.lines : [error instanceof Error ? error.message : String(error)];
  for (const line of lines) console.error(line);
  process.exitCode = 1;
} finally {
  await closePool();
}
