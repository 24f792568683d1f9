import { sayBytes } from "@/lib/deliveries/schema-bytes";
import { colourSpaceWords, qualityWords, type VersionPage } from "@/lib/versions/schema";
import { Digest } from "../figure/digest";
import { Figure } from "../figure/figure";
import { momentOf } from "../studio/moments";

/** What the version is, for good: the numbers first, because that is what an advisor reads first. */
export function Certificate({ version }: { version: VersionPage }) {
  const { seal, viewer } = version;
  const frames = version.last - version.first + 1;
  return (
    <section aria-labelledby="certificate" className="border-3 border-double border-rule px-20 py-16">
      <h2 id="certificate" className="type-heading border-b border-text pb-8 text-text">
        As it was frozen
      </h2>
      <dl>
        {version.setupFacts.map((fact, index) => (
          <Line key={fact} number={index + 1}>
            {fact}
          </Line>
        ))}
        <Line number={version.setupFacts.length + 1}>
          Rendered as {qualityWords[version.quality]}; OpenEXR in {colourSpaceWords[version.colourSpace]}, PNG
          in sRGB.
        </Line>
        <Line number={version.setupFacts.length + 2}>
          <Figure>{frames}</Figure> {frames === 1 ? "frame" : "frames"}
          {seal && (
            <>
              , <Figure>{sayBytes(seal.bytes)}</Figure>
            </>
          )}
          , kernel <Figure>{version.kernel}</Figure>
          {version.render.unresolved > 0 && (
            <>, {version.render.unresolved} light paths without an end, shown black</>
          )}
          .
        </Line>
      </dl>
      {seal ? (
        <>
          <Digest digest={seal.digest} className="mt-16" />
          <p className="type-small mt-8 text-soft">
            SHA-256 of the setup, the kernel and every file, sealed {momentOf(seal.sealedAt, viewer.timeZone)}
            .
          </p>
        </>
      ) : (
        <p className="type-label mt-16 text-soft">
          It gets its digest, and can be sent for review, once every frame is rendered.
        </p>
      )}
      {version.kernel !== version.kernelHere && (
        <p className="type-label mt-12 text-text">
          The program now has kernel <Figure>{version.kernelHere}</Figure>: a new version of this setup may
          differ.
        </p>
      )}
    </section>
  );
}

function Line({ number, children }: { number: number; children: React.ReactNode }) {
  return (
    <div className="type-label flex gap-12 border-b border-hair py-8">
      <dt className="type-figure-small w-12 shrink-0 pt-1 text-soft">{number}</dt>
      <dd className="min-w-0 text-text">{children}</dd>
    </div>
  );
}
