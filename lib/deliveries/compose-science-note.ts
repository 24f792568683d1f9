import { describeSetup } from "../reviews/describe-setup";
import { frameWords } from "../reviews/schema-declaration";
import { setupFromJson } from "@/render/scene/parse-setup";
import type { Packed } from "./packed";
import type { PlannedItem } from "./plan-delivery";
import { cautions, chosen, computed, omitted } from "./science-words";
import { wrapText } from "./wrap-text";

/** The note an educator or a client reads: what is computed, what is chosen, what is left out, and who signed what. */
export function composeScienceNote({ production, number, title, items }: Packed): string {
  const paragraphs = [
    "SCIENCE NOTE",
    wrapText(`${production}, delivery ${number}: ${title}`),
    "WHAT IS COMPUTED",
    ...computed.map((text) => wrapText(text)),
    "WHAT IS CHOSEN",
    ...chosen.map((text) => wrapText(text)),
    "WHAT IS LEFT OUT",
    ...omitted.map((text) => wrapText(text)),
    "THE FRAMES AND WHO SIGNED THEM",
    ...items.flatMap(describeItem),
    "CAUTIONS",
    ...cautions.map((text) => wrapText(text)),
  ];
  return `${paragraphs.join("\n\n")}\n`;
}

const spaces = {
  rec709: "linear Rec.709 in OpenEXR, sRGB in PNG",
  acescg: "ACEScg in OpenEXR, sRGB in PNG",
} as const;

function describeItem(item: PlannedItem): string[] {
  const setup = setupFromJson(item.setup);
  const kinds = [
    ...new Set(item.files.map(({ kind }) => (kind === "png" ? "16-bit PNG" : "half-float OpenEXR"))),
  ];
  return [
    wrapText(
      `${item.shotCode}, version ${item.number}, ${frameWords(item.first, item.last)}: ${kinds.join(" and ")}; ${item.quality} quality; ${spaces[item.colourSpace]}; engine ${item.kernel}. Made by ${item.maker}.`,
    ),
    ...(setup.ok ? [wrapText(describeSetup(setup.value).join(" "), "    ")] : []),
    `    digest ${item.digest}\n    setup  ${item.setupDigest}`,
    wrapText(
      `Signed off by ${item.advisor}, science advisor, on ${item.signedAt.toISOString().slice(0, 10)} (UTC)` +
        (item.advisorWords ? `, in these words: “${item.advisorWords}”` : ", without further words."),
      "    ",
    ),
  ];
}
