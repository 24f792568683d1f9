import { useEffect, useRef } from "react";

export interface Delay {
  /** While this does not hold, nothing is waited for. */
  when: boolean;
  /** Milliseconds. */
  after: number;
  /** The wait begins anew when this changes. */
  restart: unknown;
}

/** Does something once a condition has held for a while; at once when the page is left before that. */
export function useDelayed(act: () => void, { when, after, restart }: Delay): void {
  const latest = useRef({ act, when });
  useEffect(() => {
    latest.current = { act, when };
  });
  useEffect(() => {
    if (!when) return;
    const timer = setTimeout(() => latest.current.act(), after);
    return () => clearTimeout(timer);
  }, [when, after, restart]);
  useEffect(
    () => () => {
      if (latest.current.when) latest.current.act();
    },
    [],
  );
}
