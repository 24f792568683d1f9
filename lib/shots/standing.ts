import type { Hold, RenderState } from "@/db/enums";
import type { Standing } from "./schema-standing";

/** What a shot's standing follows from: its hold and its newest version's facts. */
export interface ShotFacts {
  hold: Hold;
  versionNumber: number | null;
  renderState: RenderState | null;
  sentAt: Date | null;
  frameCount: number | null;
  returnedFrames: number;
  signedFrames: number;
  delivered: boolean;
  received: boolean;
  refused: boolean;
}

/** A shot's standing, never set by hand (PRODUCT, "Things and their names"). The newest version governs. */
export function standingOf(facts: ShotFacts): Standing {
  if (facts.hold !== "none") return facts.hold;
  return standingOfVersion(facts);
}

/** The newest version's own standing, whatever a producer holds. */
export function standingOfVersion(facts: Omit<ShotFacts, "hold">): Standing {
  if (facts.versionNumber === null) return "open";
  if (facts.renderState === "rendering") return "rendering";
  if (facts.renderState !== "complete") return "stopped";
  if (facts.refused) return "refused";
  if (facts.received) return "received";
  if (facts.delivered) return "delivered";
  if (facts.sentAt === null) return "ready";
  if (facts.returnedFrames > 0) return "returned";
  return facts.signedFrames === facts.frameCount ? "signed off" : "in review";
}
