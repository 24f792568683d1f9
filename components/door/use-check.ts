"use client";

import { useRef, useState } from "react";
import type { DoorFile } from "@/lib/deliveries/schema-pages";
import { requestJson } from "../api/request";
import { bytesToCheck, checkFiles, findChosen, matchPaths, type CheckResult } from "./check-files";

export type Check =
  | { state: "waiting" }
  | { state: "reading" }
  | { state: "checking"; done: number; total: number }
  | { state: "done"; result: CheckResult; total: number; at: Date }
  | { state: "failed"; why: string };

/** The check of chosen files against what was signed, on this machine. */
export function useCheck(delivery: string) {
  const [check, setCheck] = useState<Check>({ state: "waiting" });
  const stop = useRef<AbortController>(undefined);
  const begin = async (chosen: readonly File[]) => {
    const { signal } = (stop.current = new AbortController());
    setCheck({ state: "reading" });
    try {
      const { files } = await requestJson<{ files: DoorFile[] }>(`/api/deliveries/${delivery}/files`, {
        signal,
      });
      const found = await findChosen(chosen);
      const total = bytesToCheck(files, matchPaths(files, found));
      const onBytes = (done: number) => setCheck({ state: "checking", done, total });
      onBytes(0);
      const result = await checkFiles(files, found, { onBytes, signal });
      setCheck({ state: "done", result, total, at: new Date() });
    } catch (error) {
      if (signal.aborted) setCheck({ state: "waiting" });
      else
        setCheck({
          state: "failed",
          why: error instanceof Error ? error.message : "The files could not be read.",
        });
    }
  };
  return { check, begin, cancel: () => stop.current?.abort() };
}
