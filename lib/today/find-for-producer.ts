import type { Ctx } from "../context";
import { listDeliveries } from "../deliveries/list-deliveries";
import { findUndelivered } from "../deliveries/find-undelivered";
import { dateIn } from "../shots/today";
import { findShots, pictureOf, type TodayShot } from "./find-shots";
import { productionsAs } from "./productions-as";
import type { TodayItem } from "./schema";

/** What a producer moves on: deliveries that wait or went wrong, signed versions in none, and shots that are late. */
export async function findForProducer(ctx: Ctx, now: Date): Promise<TodayItem[]> {
  const scope = productionsAs(ctx.actor, "producer");
  if (scope.length === 0) return [];
  const shots = await findShots(ctx.db, scope);
  const deliveries = (await listDeliveries(ctx)).filter(({ productionId }) => scope.includes(productionId));
  const undelivered = await findUndelivered(ctx.db, scope);
  const today = dateIn(ctx.actor.timeZone, now);
  return [
    ...deliveries.flatMap(describeDelivery),
    ...shots.filter(({ facts }) => undelivered.has(facts.versionId ?? "")).map(describeSigned),
    ...shots
      .filter((shot) => isLate(shot, today) && !undelivered.has(shot.facts.versionId ?? ""))
      .map(describeLate),
  ];
}

type Line = Awaited<ReturnType<typeof listDeliveries>>[number];

function describeDelivery(line: Line): TodayItem[] {
  const wrong = wrongWith(line);
  if (!wrong) return [];
  const name = `Delivery ${line.number}, ${line.title},`;
  return [
    {
      about: line.id,
      sentence: { before: "", name, after: ` ${wrong.is}` },
      detail: wrong.detail,
      act: { label: "Open the delivery", href: `/deliveries/${line.id}` },
      minutes: null,
      picture: null,
      sentOn: null,
      dueOn: null,
    },
  ];
}

function wrongWith({ withdrawnAt, publishedAt, stopped, standing, files, recipients }: Line) {
  if (withdrawnAt) return null;
  if (stopped)
    return {
      is: "is stopped.",
      detail: publishedAt
        ? `A verdict it rests on was withdrawn. ${recipients.join(", ")} cannot take it, and was told. Withdraw it, and assemble another.`
        : "A verdict it rests on was withdrawn, so it cannot be published. Withdraw it, and assemble another.",
    };
  if (standing === "refused") return { is: "was refused.", detail: "The client's words are on its page." };
  if (!publishedAt)
    return {
      is: "is made, and published to nobody yet.",
      detail: `${files} files wait for the recipients to be chosen.`,
    };
  return null;
}

const describeSigned = (shot: TodayShot): TodayItem => ({
  about: shot.id,
  sentence: {
    before: `Version ${shot.facts.versionNumber} of `,
    name: shot.code,
    after: " is signed off, and in no delivery yet.",
  },
  detail: shot.brief,
  act: { label: "Assemble a delivery", href: `/deliveries/new?production=${shot.productionId}` },
  minutes: null,
  picture: pictureOf(shot),
  sentOn: null,
  dueOn: shot.dueOn,
});

const finished: TodayShot["standing"][] = ["delivered", "received", "on hold", "omitted"];

const isLate = (shot: TodayShot, today: string) =>
  shot.dueOn !== null && shot.dueOn < today && !finished.includes(shot.standing);

const describeLate = (shot: TodayShot): TodayItem => ({
  about: shot.id,
  sentence: { before: "", name: shot.code, after: ` is late, and ${shot.standing}.` },
  detail: `${shot.brief} ${shot.artist ? `${shot.artist} has it.` : "Nobody has it."}`,
  act: { label: "Open the shot", href: `/shots/${shot.id}/bench` },
  minutes: null,
  picture: pictureOf(shot),
  sentOn: null,
  dueOn: shot.dueOn,
});
