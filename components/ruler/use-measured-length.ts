import { useLayoutEffect, useRef, useState } from "react";

/** The length of an element in whole pixels, kept in step with its size; `first` until it is known. */
export function useMeasuredLength(vertical: boolean, first: number) {
  const ref = useRef<HTMLDivElement>(null);
  const [length, setLength] = useState(first);
  useLayoutEffect(() => {
    const element = ref.current;
    if (!element || typeof ResizeObserver === "undefined") return;
    const measure = () =>
      setLength(Math.max(1, Math.floor(vertical ? element.clientHeight : element.clientWidth)));
    measure();
    const observer = new ResizeObserver(measure);
    observer.observe(element);
    return () => observer.disconnect();
  }, [vertical]);
  return { ref, length };
}
