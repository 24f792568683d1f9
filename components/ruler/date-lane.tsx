import { type Lane, type LaneFacts, layLane } from "./lane";

export interface DateLaneProps extends LaneFacts {
  className?: string;
}

const words = "type-ruler absolute whitespace-nowrap";

/** A row's continuation of the date ruler. It fills the nearest positioned parent: give that `relative` and a height. */
export function DateLane({ className = "", ...facts }: DateLaneProps) {
  const lane = layLane(facts);
  return (
    <div role="img" aria-label={lane.sentence} className={`absolute inset-0 ${className}`}>
      <div className="absolute inset-x-0 top-1/2 h-1 bg-hair" />
      {lane.today !== null && (
        <div
          className="absolute inset-y-0 w-0 border-l border-dotted border-text"
          style={{ left: `${lane.today}%` }}
        />
      )}
      <Waiting lane={lane} />
      {lane.forecast && <Forecast {...lane.forecast} />}
      {lane.due && <Due due={lane.due} today={lane.today} />}
    </div>
  );
}

function Waiting({ lane: { waiting, due, today } }: { lane: Lane }) {
  const start = waiting?.at ?? (due?.look === "late" ? due.at : null);
  const end = today ?? 100;
  if (start === null) return null;
  return (
    <>
      <div
        className="absolute top-1/2 -mt-1 h-3 bg-ember"
        style={{ left: `${start}%`, width: `${Math.max(0, end - start)}%` }}
      />
      {waiting && (
        <>
          <div className="absolute top-1/2 -mt-5 h-11 w-1 bg-ember" style={{ left: `${start}%` }} />
          <span
            className={`${words} top-1/2 mt-9 text-soft ${end < 24 ? "pl-6" : "-translate-x-full pr-6"}`}
            style={{ left: `${end}%` }}
          >
            {waiting.words}
          </span>
        </>
      )}
    </>
  );
}

function Forecast({ from, to, words: text }: NonNullable<Lane["forecast"]>) {
  return (
    <>
      <div
        className="absolute top-1/2 -mt-5 h-11 border-x border-text before:absolute before:inset-x-0 before:top-5 before:h-1 before:bg-text"
        style={{ left: `${from}%`, width: `${Math.max(0.6, to - from)}%` }}
      />
      <span
        className={`${words} top-1/2 mt-7 text-soft ${to > 76 ? "-translate-x-full" : "pl-4"}`}
        style={{ left: `${to > 76 ? from : to}%` }}
      >
        {text}
      </span>
    </>
  );
}

const looks = { met: "fill-none stroke-ice", late: "fill-ember", ahead: "fill-bright" };
const tones = { met: "text-soft", late: "text-ember", ahead: "text-text" };

function Due({ due, today }: { due: NonNullable<Lane["due"]>; today: number | null }) {
  const beside = due.look === "late" && today !== null ? today : due.at;
  const turned = beside > (due.look === "late" ? 56 : 88);
  const side = turned ? "-translate-x-full pr-8" : "pl-8";
  return (
    <>
      <svg width={12} height={10} className="absolute top-1/2 -mt-9 -ml-6" style={{ left: `${due.at}%` }}>
        <path className={looks[due.look]} d="M1 1L11 1L6 9Z" />
      </svg>
      <span
        className={`${words} top-1/2 -mt-12 ${side} ${tones[due.look]}`}
        style={{ left: `${turned ? due.at : beside}%` }}
      >
        {due.words}
      </span>
    </>
  );
}
