import { sayBytes } from "@/lib/deliveries/schema-bytes";
import type { DoorPage } from "@/lib/deliveries/schema-pages";
import { buttonLook } from "../button/button";
import { ContentsTable } from "../deliveries/contents-table";
import { Figure } from "../figure/figure";
import { LinkToMe } from "./link-to-me";
import { SingleFiles } from "./single-files";

type Contents = NonNullable<DoorPage["contents"]>;
type Props = Pick<Contents, "sets" | "texts" | "bytes" | "taken"> & {
  delivery: string;
  title: string;
  reader: DoorPage["reader"];
};

/** Beyond this a set is taken on a computer, not on a telephone. */
const handful = 50e6;

/** Taking everything, a set, or single files. On a telephone the large set is left to a computer. */
export function TakeFiles({ delivery, title, sets, texts, bytes, taken }: Props) {
  const archive = `/api/deliveries/${delivery}/archive`;
  const isLarge = bytes > handful;
  return (
    <section aria-labelledby="take" className="min-w-0">
      <div className="mb-12 flex flex-wrap items-baseline justify-between gap-12">
        <h2 id="take" className="type-heading text-text">
          Take the files
        </h2>
        <p className="type-label hidden text-soft sm:block">stops and resumes without loss</p>
      </div>
      {isLarge && (
        <p className="type-body mb-12 text-text sm:hidden">
          <Figure bright>{sayBytes(bytes)}</Figure>, best taken on a computer. <LinkToMe title={title} />
        </p>
      )}
      <ContentsTable
        sets={sets}
        texts={texts}
        actOf={
          sets.length > 1
            ? (set) => (
                <a href={`${archive}?set=${set.version}`} download className="action whitespace-nowrap">
                  take it <span className="sr-only">({set.shotCode})</span>
                </a>
              )
            : undefined
        }
      />
      <div className="mt-16 flex flex-wrap items-center gap-x-16 gap-y-12">
        <a
          href={archive}
          download
          className={`${buttonLook(taken.length > 0 ? "plain" : "primary")} ${isLarge ? "max-sm:hidden" : ""}`}
        >
          Take all, {sayBytes(bytes)}
        </a>
        <SingleFiles delivery={delivery} />
      </div>
      {taken.length > 0 && <p className="type-label mt-12 text-soft">{sayTaken(taken)}</p>}
    </section>
  );
}

function sayTaken(taken: Contents["taken"]): string {
  const whole = [...new Set(taken.filter(({ finishedAt }) => finishedAt).map(({ what }) => what))];
  if (whole.length === 0) return "A download was begun and is not finished.";
  const named = whole.slice(0, 3).join(", ");
  return `You have taken ${whole.length > 3 ? `${named} and ${whole.length - 3} more` : named}.`;
}
