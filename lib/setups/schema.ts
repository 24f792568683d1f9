import { z } from "zod";
import type { Hold } from "@/db/enums";
import { setupSchema, type Setup } from "@/render/scene/setup";
import type { VersionLine } from "../versions/schema";

export const saveSetupInput = z.object({
  shot: z.uuid("This is not the id of a shot."),
  /** The revision the change was made on. */
  revision: z.number({ error: "The revision the change was made on." }).int().min(1),
  setup: setupSchema,
});

export interface SavedSetup {
  revision: number;
  savedAt: string;
}

export interface BenchPage {
  shot: { id: string; code: string; brief: string; hold: Hold; dueOn: string | null };
  production: { id: string; name: string };
  sequence: string;
  artist: { id: string; name: string } | null;
  setup: Setup;
  revision: number;
  savedAt: string;
  savedBy: string | null;
  versions: VersionLine[];
  reader: { id: string; timeZone: string };
  may: { save: boolean; render: boolean };
}
