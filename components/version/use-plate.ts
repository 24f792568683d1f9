import { useEffect, useRef, useState, type PointerEvent, type RefObject } from "react";
import { fitView, panBy, zoomBy, type Size, type View } from "./zoom";

/** The plate's size, how the picture stands in it, and what pointers and pinches do to that. */
export function usePlate(picture: Size) {
  const ref = useRef<HTMLDivElement>(null);
  const plate = useSize(ref);
  // Null means the whole picture, whatever the plate's size becomes.
  const [moved, setMoved] = useState<View | null>(null);
  const whole = fitView(plate, picture);
  const change = (next: (view: View) => View) => setMoved((was) => next(was ?? whole));
  usePinch(ref, (factor, off) => change((view) => zoomBy(view, picture, factor, off)));
  return {
    ref,
    plate,
    view: moved ?? whole,
    isWhole: moved === null,
    fit: () => setMoved(null),
    /** One picture pixel on one pixel of the screen. */
    pixelForPixel: () => change((view) => ({ ...view, scale: 1 / window.devicePixelRatio })),
    zoom: (factor: number) => change((view) => zoomBy(view, picture, factor)),
    pan: (x: number, y: number) => change((view) => panBy(view, picture, x, y)),
  };
}

function useSize(ref: RefObject<HTMLDivElement | null>): Size {
  const [size, setSize] = useState<Size>({ width: 960, height: 519 });
  useEffect(() => {
    const element = ref.current;
    if (!element) return;
    const measure = () => setSize({ width: element.clientWidth, height: element.clientHeight });
    measure();
    const observer = new ResizeObserver(measure);
    observer.observe(element);
    return () => observer.disconnect();
  }, [ref]);
  return size;
}

type Pinch = (factor: number, off: { x: number; y: number }) => void;

/** A pinch arrives as a wheel with Ctrl. React's own wheel listeners could not keep the page from zooming. */
function usePinch(ref: RefObject<HTMLDivElement | null>, onPinch: Pinch): void {
  const latest = useRef(onPinch);
  useEffect(() => {
    latest.current = onPinch;
  });
  useEffect(() => {
    const element = ref.current;
    const pinch = (event: WheelEvent) => {
      if (!element || (!event.ctrlKey && !event.metaKey)) return;
      event.preventDefault();
      const { x, y, width, height } = element.getBoundingClientRect();
      const off = { x: event.clientX - x - width / 2, y: event.clientY - y - height / 2 };
      latest.current(Math.exp(-event.deltaY / 200), off);
    };
    element?.addEventListener("wheel", pinch, { passive: false });
    return () => element?.removeEventListener("wheel", pinch);
  }, [ref]);
}

/** Moves the picture with a pressed pointer. */
export function dragHandlers(pan: (x: number, y: number) => void) {
  return {
    onPointerDown: (event: PointerEvent<HTMLDivElement>) => {
      if (event.button === 0) event.currentTarget.setPointerCapture(event.pointerId);
    },
    onPointerMove: (event: PointerEvent<HTMLDivElement>) => {
      if (event.currentTarget.hasPointerCapture(event.pointerId)) pan(event.movementX, event.movementY);
    },
  };
}
