import type { BenchPage } from "@/lib/setups/schema";
import type { Setup } from "@/render/scene/setup";
import { requestJson } from "../api/request";
import { setupPath, type SaveState } from "./save-setup";
import { useDelayed } from "./use-delayed";
import { useSaver } from "./use-saver";

export interface Autosave {
  state: SaveState;
  /** Saves at once what is not saved yet; answers with the revision, or nothing when it could not be saved. */
  flush: () => Promise<number | undefined>;
  /** After a conflict: saves the reader's values over the other's. */
  saveOver: () => Promise<void>;
  /** After a conflict: takes the other's values. */
  takeTheirs: () => Promise<Setup>;
}

const pauseMs = 700;
const afterFailureMs = 10_000;

/** Saves the values a moment after the last change, on the revision they were made on. */
export function useAutosave(page: BenchPage, values: Setup): Autosave {
  const { state, changed, save, settled, adopt } = useSaver(page, values);
  const idle = state.kind !== "saving" && state.kind !== "conflict";
  useDelayed(() => void save(), {
    when: page.may.save && changed && idle,
    after: state.kind === "failed" ? afterFailureMs : pauseMs,
    restart: values,
  });
  const takeTheirs = async () => {
    const theirs = await requestJson<BenchPage>(setupPath(page.shot.id));
    adopt(theirs);
    return theirs.setup;
  };
  return {
    state: changed && state.kind === "saved" ? { kind: "waiting" } : state,
    flush: () => (changed ? save() : settled()),
    takeTheirs,
    saveOver: async () => {
      await takeTheirs();
      await save();
    },
  };
}
