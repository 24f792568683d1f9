"use client";

import { useRouter } from "next/navigation";
import { useEffect, useRef } from "react";
import { listen, type Change } from "./change-stream";

/**
 * Calls `onChange` for every committed change the reader may know of; without it, draws the page anew.
 * `only` narrows it to the changes this page shows.
 */
export function useChanges(only?: (change: Change) => boolean, onChange?: (change: Change) => void): void {
  const router = useRouter();
  const latest = useRef({ only, onChange });
  useEffect(() => {
    latest.current = { only, onChange };
  });

  useEffect(() => {
    let waiting: ReturnType<typeof setTimeout> | undefined;
    // Many frames may finish at once: the page is drawn anew at most every half second.
    const refresh = () => {
      waiting ??= setTimeout(() => {
        waiting = undefined;
        router.refresh();
      }, 500);
    };
    const stop = listen({
      onGap: refresh,
      onChange: (change) => {
        if (latest.current.only && !latest.current.only(change)) return;
        if (latest.current.onChange) latest.current.onChange(change);
        else refresh();
      },
    });
    return () => {
      stop();
      clearTimeout(waiting);
    };
  }, [router]);
}
