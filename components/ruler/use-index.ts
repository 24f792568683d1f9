import { useState, type KeyboardEvent, type PointerEvent } from "react";
import { valueUnderPointer } from "./drag";
import { actOnKey, readTyped } from "./keys";
import { constrain, type IndexRule } from "./rule";
import type { Placement } from "./scale";

export interface IndexControl {
  value: number;
  rule: IndexRule;
  placement: Placement;
  vertical: boolean;
  /** Every change, while it happens. */
  onChange?: ((value: number) => void) | undefined;
  /** The value that stays: on release, on Enter, after a key. */
  onCommit?: ((value: number) => void) | undefined;
}

type Mode = { kind: "rest" } | { kind: "drag"; origin: number } | { kind: "type"; text: string };

interface IndexState {
  mode: Mode;
  setMode: (mode: Mode) => void;
  /** The value Esc gives back: what it was when it was taken up. */
  before: number;
  setBefore: (value: number) => void;
}

/** An index's state machine: at rest, dragged, or typed over. */
export function useIndex(control: IndexControl) {
  const [mode, setMode] = useState<Mode>({ kind: "rest" });
  const [before, setBefore] = useState(control.value);
  const [focused, setFocused] = useState(false);
  const state = { mode, setMode, before, setBefore };
  const handlers = {
    onKeyDown: (event: KeyboardEvent) => pressKey(event, control, state),
    onPointerDown: (event: PointerEvent<SVGGElement>) => takeUp(event, control, state),
    onPointerMove: (event: PointerEvent<SVGGElement>) => drag(event, control, state),
    // Release and cancellation both end in this, once.
    onLostPointerCapture: () => mode.kind === "drag" && settle(control.value, control, state),
    onFocus: () => {
      setBefore(control.value);
      setFocused(true);
    },
    onBlur: () => {
      setFocused(false);
      leave(control, state);
    },
  };
  return { mode, boxed: focused && mode.kind !== "drag", handlers };
}

function settle(next: number, { value, onChange, onCommit }: IndexControl, { setMode }: IndexState) {
  if (next !== value) onChange?.(next);
  onCommit?.(next);
  setMode({ kind: "rest" });
}

function pressKey(event: KeyboardEvent, control: IndexControl, state: IndexState) {
  const typed = state.mode.kind === "type" ? state.mode.text : null;
  const act = actOnKey(event, control.value, typed, control.rule);
  if (!act) return;
  event.preventDefault();
  if (act.act === "type") state.setMode({ kind: "type", text: act.text });
  else if (act.act === "abandon") state.setMode({ kind: "rest" });
  else settle(act.act === "restore" ? state.before : act.value, control, state);
}

function takeUp(event: PointerEvent<SVGGElement>, { value }: IndexControl, state: IndexState) {
  if (event.button !== 0) return;
  event.currentTarget.setPointerCapture(event.pointerId);
  state.setBefore(value);
  state.setMode({ kind: "drag", origin: value });
}

function drag(event: PointerEvent<SVGGElement>, control: IndexControl, state: IndexState) {
  if (state.mode.kind !== "drag") return;
  const box = event.currentTarget.ownerSVGElement?.getBoundingClientRect();
  const pixel = control.vertical ? event.clientY - (box?.top ?? 0) : event.clientX - (box?.left ?? 0);
  const next = valueUnderPointer(pixel, control.placement, control.rule, event.altKey);
  if (next !== control.value) control.onChange?.(next);
}

/** What was typed stays when the index is left; an unreadable text is dropped. */
function leave(control: IndexControl, state: IndexState) {
  if (state.mode.kind !== "type") return;
  const typed = readTyped(state.mode.text);
  if (typed === null) state.setMode({ kind: "rest" });
  else settle(constrain(typed, control.rule), control, state);
}
