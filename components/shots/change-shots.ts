import type { ShotChange } from "@/lib/shots/schema";
import { requestJson } from "../api/request";

/** Asks for one change of several shots; throws the refusal in words. */
export const changeShots = (shots: string[], change: ShotChange): Promise<{ changed: number }> =>
  requestJson("/api/shots", { method: "PATCH", body: { shots, change } });
