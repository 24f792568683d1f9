import Link from "next/link";
import type { ShotLine } from "@/lib/shots/schema";
import { CheckBox } from "../field/check-box";
import { Standing } from "../standing/standing";
import { sayDay, dayOf, sayLate } from "../ruler/dates";
import { isMet, sayHolder, ShotPicture } from "./shot-facts";
import { sayGroup, type ShotsShown } from "./shot-table";

/** The same shots for a phone: one below the other, what matters first. */
export function ShotCards({ list, dates, chosen, onChoose }: ShotsShown) {
  return list.groups.map((group) => (
    <section key={group.id} className="mt-24">
      {group.name && (
        <h2 className="section-line">
          <span className="type-heading text-[1.25rem]">{group.name}</span>
          <span className="type-label ml-12 text-soft">{sayGroup(group)}</span>
        </h2>
      )}
      <ul>
        {group.shots.map((shot) => (
          <li key={shot.id} className="flex gap-12 border-b border-hair py-12">
            <ShotPicture shot={shot} width={83} height={45} />
            <div className="grid min-w-0 flex-1 gap-4">
              <div className="flex items-baseline justify-between gap-8">
                <Link href={`/shots/${shot.id}/bench`} className="type-figure text-text">
                  {shot.code}
                </Link>
                <Standing standing={shot.standing} className="type-label" />
              </div>
              <p className="type-note">{shot.brief}</p>
              <p className="type-label text-soft">{sayFacts(shot, dates.today)}</p>
              {shot.version && (
                <Link
                  href={`/versions/${shot.version.id}`}
                  className="action type-label justify-self-start py-4"
                >
                  Version {shot.version.number}
                </Link>
              )}
            </div>
            {onChoose && (
              <CheckBox
                label={`Choose ${shot.code}`}
                hideLabel
                checked={chosen.has(shot.id)}
                onChange={(event) => onChoose(shot.id, event.target.checked)}
                className="self-start"
              />
            )}
          </li>
        ))}
      </ul>
    </section>
  ));
}

function sayFacts(shot: ShotLine, today: string): string {
  const who = shot.holder.kind === "nobody" ? "Nobody has it" : `With ${sayHolder(shot.holder)}`;
  return `${who}; ${sayDue(shot, today)}.`;
}

function sayDue(shot: ShotLine, today: string): string {
  if (!shot.dueOn) return "no due date";
  const day = sayDay(dayOf(shot.dueOn));
  const days = dayOf(today) - dayOf(shot.dueOn);
  if (isMet(shot)) return `due ${day}, met`;
  const resting = shot.standing === "on hold" || shot.standing === "omitted";
  return days > 0 && !resting ? `${sayLate(days)}, due ${day}` : `due ${day}`;
}
