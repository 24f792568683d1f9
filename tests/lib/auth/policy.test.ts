import { describe, expect, it } from "vitest";
import { authorize, may, productionsWhere } from "@/lib/auth/authorize";
import { policy, type Action, type Standing } from "@/lib/auth/policy";
import type { Actor } from "@/lib/context";
import { DomainError } from "@/lib/errors";

const standings = ["artist", "advisor", "producer", "client", "owner"] as const satisfies readonly Standing[];

/** What the product promises, written out anew: a yes for each of artist, advisor, producer, client, owner. */
const promised: Record<Action, string> = {
  "production.see": "yes yes yes no yes",
  "production.create": "no no no no yes",
  "people.see": "no no yes no yes",
  "people.invite": "no no yes no yes",
  "people.remove": "no no yes no yes",
  "people.close": "no no no no yes",
  "studio.see": "no no no no yes",
  "studio.mail": "no no no no yes",
  "log.see": "yes yes yes no yes",
  "shot.see": "yes yes yes no yes",
  "shot.create": "no no yes no yes",
  "shot.change": "no no yes no yes",
  "setup.see": "yes yes yes no yes",
  "setup.save": "yes no no no no",
  "version.see": "yes yes yes no yes",
  "version.render": "yes no no no no",
  "version.cancel": "yes no yes no yes",
  "version.resume": "yes no yes no yes",
  "review.see": "yes yes yes no yes",
  "review.send": "yes no no no no",
  "verdict.give": "no yes no no no",
  "verdict.withdraw": "no yes no no no",
  "delivery.make": "no no yes no no",
  "delivery.publish": "no no yes no no",
  "delivery.withdraw": "no no yes no no",
  "delivery.see": "yes yes yes no yes",
  "door.open": "no no no yes no",
  "door.take": "no no no yes no",
  "door.sign": "no no no yes no",
};

const here = "11111111-1111-4111-8111-111111111111";
const elsewhere = "22222222-2222-4222-8222-222222222222";
const studio = ["production.create", "people.close", "studio.see", "studio.mail"];

function actorOf(standing: Standing | null): Actor {
  const isOwner = standing === "owner";
  const role = standing === null || standing === "owner" ? null : standing;
  const roles: Actor["roles"] = new Map(
    isOwner
      ? [
          [here, null],
          [elsewhere, null],
        ]
      : role
        ? [[here, role]]
        : [],
  );
  return { id: "p", name: "P", email: "p@ringwright.example", timeZone: "UTC", isOwner, roles };
}

const actions = Object.keys(policy) as Action[];
const table = actions.flatMap((action) =>
  standings.map((standing, index) => {
    const allowed = promised[action].split(" ")[index] === "yes";
    return { action, standing, allowed, verb: allowed ? "may" : "may not" };
  }),
);

const refusalOf = (work: () => void): string => {
  try {
    work();
    return "nothing was refused";
  } catch (error) {
    return error instanceof DomainError ? error.code : String(error);
  }
};

describe("the policy", () => {
  it("has no action that this table does not promise", () => {
    expect(Object.keys(promised).sort()).toEqual([...actions].sort());
  });

  it.each(table)("says that $standing $verb $action", ({ action, standing, allowed }) => {
    const scope = studio.includes(action) ? null : here;
    expect(may(actorOf(standing), action, scope)).toBe(allowed);
    expect(refusalOf(() => authorize(actorOf(standing), action, scope)) === "nothing was refused").toBe(
      allowed,
    );
  });

  it.each(actions)("denies %s to someone who belongs nowhere", (action) => {
    expect(may(actorOf(null), action, here)).toBe(false);
    expect(may(actorOf(null), action, null)).toBe(false);
  });

  it.each(actions)("gives nobody but the owner %s in a production they are not in", (action) => {
    for (const standing of ["artist", "advisor", "producer", "client"] as const)
      expect(may(actorOf(standing), action, elsewhere)).toBe(false);
  });
});

describe("a refusal", () => {
  it("tells an outsider only that there is no such thing, and a member that their role does not allow it", () => {
    expect(refusalOf(() => authorize(actorOf("artist"), "verdict.give", elsewhere))).toBe("not-found");
    expect(refusalOf(() => authorize(actorOf("artist"), "verdict.give", here))).toBe("forbidden");
  });

  it("tells a client nothing of what is not theirs", () => {
    expect(refusalOf(() => authorize(actorOf("client"), "shot.see", here))).toBe("not-found");
    expect(refusalOf(() => authorize(actorOf("client"), "log.see", here))).toBe("not-found");
  });
});

describe("the scope of a list", () => {
  it("holds the productions in which the role allows it, and no other", () => {
    expect(productionsWhere(actorOf("producer"), "people.see")).toEqual([here]);
    expect(productionsWhere(actorOf("client"), "log.see")).toEqual([]);
    expect(productionsWhere(actorOf("owner"), "people.see")).toEqual([here, elsewhere]);
    expect(productionsWhere(actorOf("owner"), "setup.save")).toEqual([]);
  });
});
