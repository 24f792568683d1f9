import type { StandingRun } from "@/lib/reviews/schema";
import { frameWords } from "@/lib/reviews/schema-declaration";
import { StandingGlyph } from "../standing/standing-glyph";

const glyphs = { "signed off": "signed off", returned: "returned", withdrawn: "in review" } as const;
const words = {
  "signed off": "signed off",
  returned: "returned",
  withdrawn: "sign-off withdrawn",
};

/** What stands on which frames at present, in whose words. */
export function Standing({ runs, timeZone }: { runs: StandingRun[]; timeZone: string }) {
  return (
    <section aria-label="What stands at present" className="mt-16 max-w-720">
      <ul className="border-t border-hair">
        {runs.map((run) => (
          <li key={`${run.verdictId} ${run.first}`} className="flex gap-12 border-b border-hair py-8">
            <StandingGlyph standing={glyphs[run.kind]} className="mt-1" />
            <p className="type-label min-w-0 text-text">
              {capital(frameWords(run.first, run.last))}: {words[run.kind]} by {run.givenBy} on{" "}
              {dayOf(run.givenAt, timeZone)}.
              {run.words && <span className="type-note block text-soft">“{run.words}”</span>}
            </p>
          </li>
        ))}
      </ul>
    </section>
  );
}

const capital = (text: string) => text.charAt(0).toUpperCase() + text.slice(1);

const dayOf = (iso: string, timeZone: string) =>
  new Date(iso).toLocaleDateString("en-GB", { day: "numeric", month: "short", year: "numeric", timeZone });
