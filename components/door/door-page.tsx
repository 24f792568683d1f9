import type { DoorPage as Facts } from "@/lib/deliveries/schema-pages";
import { Figure } from "../figure/figure";
import { LivePage } from "../live/live-page";
import { Standing } from "../standing/standing";
import { dayOf } from "../studio/moments";
import { capitalised, countOf } from "../words/number-words";
import { CheckArrived } from "./check-arrived";
import { DoorPictures } from "./door-pictures";
import { ReceiptForm } from "./receipt-form";
import { ScienceNote } from "./science-note";
import { ShutDoor } from "./shut-door";
import { TakeFiles } from "./take-files";

/** A client's delivery: take it, check it, say that it arrived. The note stands beside. */
export function DoorPage({ door }: { door: Facts }) {
  const { contents, state, reader } = door;
  return (
    <div className="mx-auto w-full max-w-1600 px-16 pt-16 pb-48 sm:px-48 xl:px-72">
      <LivePage />
      <div className="type-label flex flex-wrap items-baseline justify-between gap-x-24 gap-y-2 text-soft">
        <p>
          From the studio of {door.production}, through{" "}
          <span className="type-note text-text">Ringwright</span>
        </p>
        {state.kind !== "closed" && (
          <p>
            For {reader.name}; open until <Figure>{dayOf(state.until, reader.timeZone)}</Figure>
          </p>
        )}
      </div>
      {contents && state.kind === "open" ? (
        <Open door={door} contents={contents} />
      ) : (
        <ShutDoor door={door} />
      )}
    </div>
  );
}

function Open({ door, contents }: { door: Facts; contents: NonNullable<Facts["contents"]> }) {
  const facts = { delivery: door.id, ...contents };
  return (
    <>
      <h1 className="type-title mt-16 text-text max-sm:mt-8 max-sm:text-[1.75rem] max-sm:leading-33">
        {sayContents(contents, door.receipt?.kind)}
      </h1>
      <p className="type-prose mt-4 max-w-720 text-soft">
        {door.title}. {contents.words}
      </p>
      <div className="mt-24 grid gap-x-72 gap-y-36 lg:grid-cols-[minmax(0,1fr)_minmax(280px,400px)] xl:gap-x-80">
        <div className="grid min-w-0 content-start gap-36">
          <DoorPictures delivery={door.id} sets={contents.sets} />
          <TakeFiles {...facts} reader={door.reader} title={door.title} />
          <CheckArrived delivery={door.id} bytes={contents.bytes} folder={contents.folder} />
        </div>
        <div className="flex min-w-0 flex-col gap-48">
          <ScienceNote contents={contents} timeZone={door.reader.timeZone} />
          <section aria-labelledby="say" className="border-y border-text py-16">
            <h2 id="say" className="type-heading text-text">
              Say they arrived
            </h2>
            {door.receipt ? (
              <div className="mt-12 grid gap-12">
                <Standing standing={door.receipt.kind} />
                <p className="type-prose break-words whitespace-pre-line text-text">
                  {door.receipt.statement}
                </p>
                <p className="type-label text-soft">
                  Signed on {dayOf(door.receipt.signedAt, door.reader.timeZone)}. The studio has been told.
                </p>
              </div>
            ) : (
              <ReceiptForm door={door} files={contents.files} isTaken={contents.taken.length > 0} />
            )}
          </section>
        </div>
      </div>
    </>
  );
}

/** "Two shots, 192 frames, signed off and ready." */
function sayContents({ sets }: NonNullable<Facts["contents"]>, receipt?: string): string {
  const frames = sets.reduce((sum, { first, last }) => sum + last - first + 1, 0);
  const state =
    receipt === "received" ? "signed off and received" : receipt ? "refused" : "signed off and ready";
  return `${capitalised(countOf(sets.length, "shot", "shots"))}, ${countOf(frames, "frame", "frames")}, ${state}.`;
}
