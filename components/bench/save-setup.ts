import { setupSchema, type Setup } from "@/render/scene/setup";
import type { SavedSetup } from "@/lib/setups/schema";
import { requestJson, RequestError } from "../api/request";

export type SaveState =
  | { kind: "saved"; at: string; by: string | null }
  | { kind: "waiting" }
  | { kind: "saving" }
  | { kind: "unfit" }
  | { kind: "failed"; message: string }
  /** Someone else saved first; the reader's own values stay in the form until they choose. */
  | { kind: "conflict"; message: string };

export interface SaveOutcome {
  state: SaveState;
  /** What the server now holds, when it took the values. */
  saved?: { revision: number; setup: Setup };
}

export const setupPath = (shotId: string): string => `/api/shots/${shotId}/setup`;

/** Sends the values to be saved on a revision. Never throws: what went wrong is the outcome. */
export async function saveSetup(shotId: string, revision: number, values: Setup): Promise<SaveOutcome> {
  const parsed = setupSchema.safeParse(values);
  if (!parsed.success) return { state: { kind: "unfit" } };
  try {
    const body = { revision, setup: parsed.data };
    const answer = await requestJson<SavedSetup>(setupPath(shotId), { method: "PUT", body });
    return {
      state: { kind: "saved", at: answer.savedAt, by: null },
      saved: { revision: answer.revision, setup: values },
    };
  } catch (error) {
    const message = error instanceof Error ? error.message : "It could not be saved.";
    const conflict = error instanceof RequestError && error.code === "conflict";
    return { state: { kind: conflict ? "conflict" : "failed", message } };
  }
}
