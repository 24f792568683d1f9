import { describe, expect, it } from "vitest";
import { currentScreen } from "@/app/current-screen";
import { otherRoom, parseSwapped } from "@/app/room";
import { sayRoles, screensFor } from "@/app/shell-actor";
import type { Actor } from "@/lib/context";

const actor = (
  roles: [string, "artist" | "advisor" | "producer" | "client" | null][],
  isOwner = false,
): Actor => ({
  id: "a",
  name: "Wen Halloway",
  email: "wen@ringwright.example",
  timeZone: "UTC",
  isOwner,
  roles: new Map(roles),
});

const labels = (who: Actor) => screensFor(who).map(({ label }) => label);

describe("the bar's screens", () => {
  it("are those the reader's roles open", () => {
    expect(labels(actor([["p", "artist"]]))).toEqual(["Today", "Shots", "Review", "Deliveries"]);
    expect(labels(actor([["p", "producer"]]))).toEqual(["Today", "Shots", "Review", "Deliveries", "Studio"]);
    expect(labels(actor([["p", null]], true))).toEqual(["Today", "Shots", "Review", "Deliveries", "Studio"]);
  });

  it("are the deliveries alone for a client, and none for someone who belongs nowhere", () => {
    expect(labels(actor([["p", "client"]]))).toEqual(["Deliveries"]);
    expect(labels(actor([]))).toEqual([]);
  });

  it("belong to the addresses beneath them, and a version to the screen it is looked at from", () => {
    const items = [{ href: "/shots" }, { href: "/review" }];
    expect(currentScreen("/shots/LR-010/bench", items)).toBe("/shots");
    expect(currentScreen("/shotsheet", items)).toBeUndefined();
    expect(currentScreen("/versions/7", items)).toBe("/review");
    expect(currentScreen("/versions/7", [{ href: "/shots" }])).toBe("/shots");
  });
});

describe("the reader's roles", () => {
  it("are said once each, in words", () => {
    expect(
      sayRoles(
        actor([
          ["p", "advisor"],
          ["q", "advisor"],
        ]),
      ),
    ).toBe("science advisor");
    expect(
      sayRoles(
        actor([
          ["p", "artist"],
          ["q", "producer"],
        ]),
      ),
    ).toBe("artist and producer");
    expect(sayRoles(actor([["p", null]], true))).toBe("owner");
    expect(sayRoles(actor([]))).toBe("");
  });
});

describe("the reader's room", () => {
  it("is remembered for each kind of page, and nonsense in the cookie is passed over", () => {
    expect(parseSwapped(undefined)).toEqual([]);
    expect(parseSwapped("viewing.desk")).toEqual(["desk", "viewing"]);
    expect(parseSwapped("viewing")).toEqual(["viewing"]);
    expect(parseSwapped("cellar.desk.<script>")).toEqual(["desk"]);
  });

  it("turns to the other and back", () => {
    expect(otherRoom(otherRoom("desk"))).toBe("desk");
    expect(otherRoom("desk")).toBe("viewing");
  });
});
