import Image from "next/image";
import { sayBytes } from "@/lib/deliveries/schema-bytes";
import type { DeclarationFacts } from "@/lib/reviews/schema-pages";
import { Digest } from "../figure/digest";
import { Figure } from "../figure/figure";
import { framePath } from "../version/frame-path";

/** What the verdict is given on: the picture, its digest, what was set, and what the artist asks. */
export function Evidence({ facts }: { facts: DeclarationFacts }) {
  const { digest, bytes, kernel, first, last, setupFacts, sentByName, sentWords } = facts;
  const frames = last - first + 1;
  return (
    <aside aria-label="What it is given on" className="min-w-0">
      {digest && <MiddleFrame facts={facts} />}
      {digest && (
        <>
          <Digest digest={digest} markLast className="mt-16" />
          <p className="type-label mt-8 text-soft">
            SHA-256 of the setup, kernel <Figure>{kernel}</Figure> and {frames}{" "}
            {frames === 1 ? "frame" : "frames"}, <Figure>{sayBytes(bytes ?? 0)}</Figure>
          </p>
        </>
      )}
      {sentWords && (
        <>
          <Heading>What {sentByName} asks</Heading>
          <p className="type-note py-10 text-text">“{sentWords}”</p>
        </>
      )}
      <Heading>What was set</Heading>
      <ul>
        {[...setupFacts, qualityOf(facts)].map((fact) => (
          <li key={fact} className="type-label border-b border-hair py-8 text-text">
            {fact}
          </li>
        ))}
      </ul>
      <p className="type-label mt-12 text-soft">
        This build makes no check sheet, finds no departures and screens for no flashes: what you sign is what
        you have looked at.
      </p>
    </aside>
  );
}

const Heading = ({ children }: { children: React.ReactNode }) => (
  <h2 className="type-label mt-24 border-b border-text pb-8 font-medium text-text">{children}</h2>
);

function MiddleFrame({ facts }: { facts: DeclarationFacts }) {
  const frame = Math.floor((facts.first + facts.last) / 2);
  const { width, height } = facts.pictureSize ?? { width: 16, height: 9 };
  const shown = { width: 456, height: Math.round((456 * height) / width) };
  return (
    <figure>
      <Image
        unoptimized
        src={framePath(facts.id, frame, "png")}
        alt={`Frame ${frame} of version ${facts.number} of ${facts.shotCode}. ${facts.setupFacts[1] ?? ""}`}
        {...shown}
        className="block h-auto w-full bg-sunk"
      />
      <figcaption className="type-figure-small mt-4 text-soft">frame {frame}</figcaption>
    </figure>
  );
}

const spaces = { rec709: "linear Rec.709", acescg: "ACEScg" };

const qualityOf = ({ quality, colourSpace, maker }: DeclarationFacts) =>
  `It was rendered in ${quality} quality, in ${spaces[colourSpace]} for OpenEXR and sRGB for PNG, by ${maker}.`;
