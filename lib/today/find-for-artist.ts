import type { Ctx } from "../context";
import { findRuns } from "../reviews/find-verdicts";
import { frameWords } from "../reviews/schema-declaration";
import { findShots, pictureOf, type TodayShot } from "./find-shots";
import { productionsAs } from "./productions-as";
import { minutesForVersion, minutesForWords } from "./reading-time";
import type { TodayItem } from "./schema";

/** An artist's own shots that ask for work: returned, stopped, whole but not sent, or not begun. */
export async function findForArtist(ctx: Ctx): Promise<TodayItem[]> {
  const shots = await findShots(ctx.db, productionsAs(ctx.actor, "artist"));
  const mine = shots.filter(
    ({ artistId, facts }) => artistId === ctx.actor.id || facts.madeBy === ctx.actor.id,
  );
  const items = await Promise.all(mine.map((shot) => describe(ctx, shot)));
  return items.filter((item) => item !== null);
}

async function describe(ctx: Ctx, shot: TodayShot): Promise<TodayItem | null> {
  const { versionId, versionNumber } = shot.facts;
  if (versionId === null)
    return shot.standing === "open"
      ? {
          ...placeOf(shot),
          sentence: { before: "", name: shot.code, after: " waits for its first version." },
          detail: shot.brief,
          act: { label: "Set it up", href: `/shots/${shot.id}/bench` },
          minutes: null,
        }
      : null;
  const named = {
    ...placeOf(shot),
    act: { label: `Open version ${versionNumber}`, href: `/versions/${versionId}` },
  };
  const say = (after: string) => ({ before: `Version ${versionNumber} of `, name: shot.code, after });
  if (shot.standing === "ready") {
    const frames = shot.last! - shot.first! + 1;
    const minutes = minutesForVersion(frames);
    const detail = `Look through it and send it for review: ${frameWords(shot.first!, shot.last!)}; ${minutes} minutes.`;
    return { ...named, sentence: say(" is whole, and not sent yet."), detail, minutes };
  }
  if (shot.standing === "stopped" && shot.facts.renderState === "failed")
    return {
      ...named,
      sentence: say(` stopped at frame ${shot.failedFrame}.`),
      detail: shot.failure ?? "",
      minutes: null,
    };
  if (shot.standing === "returned")
    return { ...named, ...(await describeReturn(ctx, versionId)), sentence: say(" was returned.") };
  return null;
}

async function describeReturn(ctx: Ctx, versionId: string) {
  const returned = (await findRuns(ctx.db, versionId)).filter(({ kind }) => kind === "returned");
  const minutes = minutesForWords(returned.map(({ words }) => words).join(" "));
  const said = returned.map((run) => `${run.givenBy} on ${frameWords(run.first, run.last)}: “${run.words}”`);
  return {
    detail: `${said.join(" ")} ${minutes === 1 ? "One minute" : `${minutes} minutes`} to read.`,
    minutes,
  };
}

const placeOf = (shot: TodayShot) => ({
  about: shot.id,
  picture: pictureOf(shot),
  sentOn: null,
  dueOn: shot.dueOn,
});
