// The view a shot's standing is read from; drizzle/0001_guarantees.sql makes it.
import { boolean, integer, pgView, text, uuid } from "drizzle-orm/pg-core";
import { holds, renderStates } from "../enums";
import { at } from "./columns";

export const shotFacts = pgView("shot_facts", {
  shotId: uuid("shot_id").notNull(),
  productionId: uuid("production_id").notNull(),
  hold: text("hold", { enum: holds }).notNull(),
  versionId: uuid("version_id"),
  versionNumber: integer("version_number"),
  madeBy: uuid("made_by"),
  renderState: text("render_state", { enum: renderStates }),
  sentAt: at("sent_at"),
  returnedFrames: integer("returned_frames").notNull(),
  signedFrames: integer("signed_frames").notNull(),
  frameCount: integer("frame_count"),
  delivered: boolean("delivered").notNull(),
  received: boolean("received").notNull(),
  refused: boolean("refused").notNull(),
}).existing();
