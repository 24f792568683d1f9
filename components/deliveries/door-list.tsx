import { sayBytes } from "@/lib/deliveries/schema-bytes";
import type { DoorLine } from "@/lib/deliveries/schema-pages";
import { LinkButton } from "../button/link-button";
import { Standing } from "../standing/standing";
import { dayOf } from "../studio/moments";

/** The doors that stand open to a client, newest first. */
export function DoorList({ doors, timeZone }: { doors: DoorLine[]; timeZone: string }) {
  if (doors.length === 0)
    return (
      <p className="type-body mt-12 max-w-560 text-soft">
        When the studio publishes a delivery to you, it stands here and a letter tells you so.
      </p>
    );
  const first = doors.find(({ receipt, stopped }) => receipt === null && !stopped);
  return (
    <ul className="mt-24 border-t border-text">
      {doors.map((door) => (
        <li
          key={door.id}
          className="flex flex-wrap items-center gap-x-24 gap-y-12 border-b border-hair py-16"
        >
          <div className="min-w-0 flex-1 basis-300">
            <h2 className="type-heading text-text">{door.title}</h2>
            <p className="type-label mt-4 text-soft">
              {door.production}, delivery {door.number}; {sayBytes(door.bytes)}; open until{" "}
              {dayOf(door.until, timeZone)}
            </p>
          </div>
          <DoorStanding door={door} />
          <LinkButton href={`/deliveries/${door.id}`} look={door === first ? "primary" : "plain"}>
            Open it<span className="sr-only">: {door.title}</span>
          </LinkButton>
        </li>
      ))}
    </ul>
  );
}

function DoorStanding({ door }: { door: DoorLine }) {
  if (door.receipt) return <Standing standing={door.receipt} />;
  if (door.stopped) return <Standing standing="stopped" />;
  return (
    <span className="type-label text-soft">{door.taken ? "taken; receipt not signed" : "not taken yet"}</span>
  );
}
