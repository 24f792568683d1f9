import { randomUUID } from "node:crypto";
import type { versions } from "@/db/schema/versions";
import type { Ctx } from "../context";
import type { Workshop } from "../renders/run-frame-job";
import type { Part, Studio } from "./gather-studio";
import type { StoryProduction } from "./story";

export type VersionRow = typeof versions.$inferSelect;

/** Where a demonstration shot is carried forward: with which tools, by whom, in which production. */
export interface Stage {
  shop: Workshop;
  studio: Studio;
  production: StoryProduction;
  sequence: StoryProduction["sequences"][number];
}

export const as = ({ shop, studio }: Stage, part: Part): Ctx => ({
  db: shop.db,
  actor: studio[part],
  requestId: randomUUID(),
});
