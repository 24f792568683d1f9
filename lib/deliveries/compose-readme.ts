import type { Packed } from "./packed";
import { wrapText } from "./wrap-text";

/** How to check, on any machine, that what arrived is what was signed. */
export function composeReadme({ production, number, title, words }: Packed): string {
  const paragraphs = [
    wrapText(`${production}, delivery ${number}: ${title}`),
    ...(words ? [wrapText(words)] : []),
    wrapText(
      "frames/ holds the signed frames, byte for byte as the science advisor signed them. science/ holds the science note and each version's setup. manifest-sha256.txt lists the SHA-256 checksum of every other file here.",
    ),
    "TO CHECK WHAT ARRIVED",
    wrapText("In a terminal, in the folder that holds this file. On Linux:"),
    "    sha256sum --check --quiet manifest-sha256.txt",
    "On macOS:",
    "    shasum -a 256 --check --quiet manifest-sha256.txt",
    wrapText(
      'Nothing printed means that every file is as it was signed. If you took only some of the sets, the others are reported missing; add --ignore-missing. Or use "Check what arrived" on the delivery\'s page: it checks in your browser and sends nothing back.',
    ),
    wrapText(
      "If a file does not match, do not use it. Take it again; if it still does not match, refuse the delivery on its page and say which file it was.",
    ),
    "THE SIGNED DIGEST",
    wrapText(
      "A version's digest, named in the science note, is the SHA-256 of a list of its setup's digest, the engine's version and the checksum of every file of every frame. Where that list is science/<version>/version-manifest.txt, sha256sum of it is the digest. It is left out where only a part of the version's files was delivered.",
    ),
  ];
  return `${paragraphs.join("\n\n")}\n`;
}
