import { useEffect, useRef, useState } from "react";
import type { BenchPage } from "@/lib/setups/schema";
import type { Setup } from "@/render/scene/setup";
import { requestJson } from "../api/request";
import { saveSetup, setupPath, type SaveState } from "./save-setup";

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

const same = (a: unknown, b: unknown) => JSON.stringify(a) === JSON.stringify(b);

/** Saves the values a moment after the last change, on the revision they were made on, one save at a time. */
export function useAutosave(page: BenchPage, values: Setup): Autosave {
  const [state, setState] = useState<SaveState>({ kind: "saved", at: page.savedAt, by: page.savedBy });
  const [saved, setSaved] = useState({ revision: page.revision, setup: page.setup });
  const changed = !same(values, saved.setup);

  const save = async (revision: number): Promise<number | undefined> => {
    setState({ kind: "saving" });
    const outcome = await saveSetup(page.shot.id, revision, values);
    if (outcome.saved) setSaved(outcome.saved);
    setState(outcome.state);
    return outcome.saved?.revision;
  };
  const idle = state.kind !== "saving" && state.kind !== "conflict";
  useDelayed(() => void save(saved.revision), {
    when: page.may.save && changed && idle,
    after: state.kind === "failed" ? afterFailureMs : pauseMs,
    restart: values,
  });

  const fetchTheirs = async () => {
    const theirs = await requestJson<BenchPage>(setupPath(page.shot.id));
    setSaved({ revision: theirs.revision, setup: theirs.setup });
    return theirs;
  };
  return {
    state: changed && state.kind === "saved" ? { kind: "waiting" } : state,
    flush: async () => (changed ? save(saved.revision) : saved.revision),
    saveOver: async () => void (await save((await fetchTheirs()).revision)),
    takeTheirs: async () => {
      const theirs = await fetchTheirs();
      setState({ kind: "saved", at: theirs.savedAt, by: theirs.savedBy });
      return theirs.setup;
    },
  };
}

/** Does something once a condition has held for a while since `restart` last changed. */
function useDelayed(
  act: () => void,
  { when, after, restart }: { when: boolean; after: number; restart: unknown },
) {
  const latest = useRef(act);
  useEffect(() => {
    latest.current = act;
  });
  useEffect(() => {
    if (!when) return;
    const timer = setTimeout(() => latest.current(), after);
    return () => clearTimeout(timer);
  }, [when, after, restart]);
}
