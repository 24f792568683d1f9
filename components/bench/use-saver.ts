import { useRef, useState } from "react";
import type { BenchPage } from "@/lib/setups/schema";
import type { Setup } from "@/render/scene/setup";
import { saveSetup, type SaveState } from "./save-setup";

const same = (a: unknown, b: unknown) => JSON.stringify(a) === JSON.stringify(b);

/** What the server holds, on which revision, and the one way to change it: one save at a time. */
export function useSaver(page: BenchPage, values: Setup) {
  const [state, setState] = useState<SaveState>({ kind: "saved", at: page.savedAt, by: page.savedBy });
  const [saved, setSaved] = useState(page.setup);
  const revision = useRef(page.revision);
  const inHand = useRef<Promise<unknown>>(Promise.resolve());

  const save = (): Promise<number | undefined> => {
    setState({ kind: "saving" });
    const job = inHand.current.then(async () => {
      const outcome = await saveSetup(page.shot.id, revision.current, values);
      setState(outcome.state);
      if (!outcome.saved) return undefined;
      setSaved(outcome.saved.setup);
      return (revision.current = outcome.saved.revision);
    });
    inHand.current = job;
    return job;
  };
  return {
    state,
    changed: !same(values, saved),
    save,
    /** The revision once nothing is in hand. */
    settled: () => inHand.current.then(() => revision.current),
    /** Takes the server's present setup as what was last saved. */
    adopt: (theirs: BenchPage) => {
      revision.current = theirs.revision;
      setSaved(theirs.setup);
      setState({ kind: "saved", at: theirs.savedAt, by: theirs.savedBy });
    },
  };
}
