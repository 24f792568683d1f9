import type { DeclarationFacts } from "@/lib/reviews/schema-pages";
import { TextLink } from "../button/text-action";
import { Figure } from "../figure/figure";
import { LivePage } from "../live/live-page";
import { Message } from "../message/message";
import { DeclarationForm } from "./declaration-form";
import { Evidence } from "./evidence";
import { Standing } from "./standing-runs";

/** The verdict as a declaration in full sentences, beside what it is given on. */
export function VerdictPage({ facts }: { facts: DeclarationFacts }) {
  const { shotCode, number, first, last, obstacle, runs, reader } = facts;
  return (
    <div className="mx-auto w-full max-w-1920 px-16 pt-36 pb-72 sm:px-48 xl:pl-120">
      <LivePage about={{ versionId: facts.id }} />
      <div className="grid gap-x-96 gap-y-48 lg:grid-cols-[minmax(0,720px)_360px] xl:grid-cols-[minmax(0,720px)_456px] lg:gap-x-48 xl:justify-between xl:gap-x-96">
        <div className="min-w-0">
          <p className="type-figure text-soft">
            <TextLink href={`/versions/${facts.id}`}>
              {shotCode} version {number}
            </TextLink>
            , declaration of {dayOf(reader.timeZone)}
          </p>
          <h1 className="type-title mt-8 text-text max-sm:text-[1.875rem] max-sm:leading-38">
            Verdict on {first === last ? "frame" : "frames"}{" "}
            <Figure className="text-[0.86em]">{first === last ? first : `${first}–${last}`}</Figure>
          </h1>
          {runs.length > 0 && <Standing runs={runs} timeZone={reader.timeZone} />}
          {obstacle ? (
            <Message announce={false} className="mt-24 max-w-640">
              {obstacle}
            </Message>
          ) : (
            <DeclarationForm facts={facts} />
          )}
        </div>
        <Evidence facts={facts} />
      </div>
    </div>
  );
}

const dayOf = (timeZone: string) =>
  new Date().toLocaleDateString("en-GB", { day: "numeric", month: "long", year: "numeric", timeZone });
