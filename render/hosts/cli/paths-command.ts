// `paths < rays.json`: light paths of any rays, as JSON, for pipelines.
import { describeIssues, jsonFromText } from "../../scene/parse-setup";
import { Refusal } from "./refusal";
import { raysSchema } from "./ray-schema";
import { traceRays } from "./trace-rays";

/** The text of the answer to a text of rays. Throws a Refusal that names every ray and field at fault. */
export function answerRays(text: string): string {
  if (text.trim() === "")
    throw new Refusal(["rays: Nothing came on the standard input. Give an array of rays: paths < rays.json"]);
  const json = jsonFromText(text);
  if (!json.ok) throw new Refusal(json.problems.map((problem) => `rays: ${problem}`));
  const rays = raysSchema.safeParse(json.value);
  if (!rays.success) throw new Refusal(describeIssues(rays.error, "rays"));
  return `${JSON.stringify(traceRays(rays.data), null, 2)}\n`;
}
