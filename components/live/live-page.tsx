"use client";

import { useChanges } from "./use-changes";

export interface LivePageProps {
  /** The production, version, shot or delivery whose changes concern the page; every change when it is left out. */
  about?: Record<string, string>;
}

/** Keeps a page that was drawn on the server in step with what others do. Draws nothing itself. */
export function LivePage({ about }: LivePageProps) {
  useChanges((change) => !about || Object.entries(about).every(([name, value]) => change[name] === value));
  return null;
}
