"use client";

import { useRouter } from "next/navigation";
import { useEffect, useRef } from "react";

/** What open pages are told of: the event's kind, and the ids of what it happened to. */
export interface Change {
  kind: string;
  [name: string]: string | number | null;
}

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
    const source = new EventSource("/api/changes");
    let opened = false;
    source.addEventListener("open", () => {
      // After a break something may have been missed.
      if (opened) refresh();
      opened = true;
    });
    source.addEventListener("message", (message) => {
      const change = JSON.parse(String(message.data)) as Change;
      if (latest.current.only && !latest.current.only(change)) return;
      if (latest.current.onChange) latest.current.onChange(change);
      else refresh();
    });
    return () => {
      source.close();
      clearTimeout(waiting);
    };
  }, [router]);
}
