// What a key does to an index. Pure: the state is the value, and the digits typed so far.
import { constrain, freeEnds, type IndexRule, nextSnap, step } from "./rule";

export interface KeyPress {
  key: string;
  shiftKey: boolean;
  altKey: boolean;
  ctrlKey: boolean;
  metaKey: boolean;
}

export type KeyAct =
  | { act: "move"; value: number }
  | { act: "type"; text: string }
  | { act: "write"; value: number }
  | { act: "abandon" }
  | { act: "restore" };

const directions: Record<string, 1 | -1> = {
  ArrowRight: 1,
  ArrowUp: 1,
  ArrowLeft: -1,
  ArrowDown: -1,
  PageUp: 1,
  PageDown: -1,
};

/** The number someone typed; commas and the true minus sign are understood. */
export function readTyped(text: string): number | null {
  const plain = text.replace(",", ".").replace("−", "-");
  const value = Number(plain);
  return plain.trim() === "" || !Number.isFinite(value) ? null : value;
}

export function actOnKey(
  press: KeyPress,
  value: number,
  typed: string | null,
  rule: IndexRule,
): KeyAct | null {
  if (press.ctrlKey || press.metaKey) return null;
  return (
    (typed === null ? null : actWhileTyping(press.key, typed, rule)) ??
    actOnMove(press, value, rule) ??
    begin(press)
  );
}

function actWhileTyping(key: string, typed: string, rule: IndexRule): KeyAct | null {
  if (key === "Escape") return { act: "abandon" };
  if (key === "Backspace")
    return typed.length > 1 ? { act: "type", text: typed.slice(0, -1) } : { act: "abandon" };
  if (/^[\d.,eE+\-−]$/.test(key)) return { act: "type", text: typed + key };
  if (key !== "Enter") return null;
  const value = readTyped(typed);
  return value === null ? { act: "abandon" } : { act: "write", value: constrain(value, rule) };
}

function actOnMove({ key, shiftKey, altKey }: KeyPress, value: number, rule: IndexRule): KeyAct | null {
  const direction = directions[key];
  if (direction && key.startsWith("Page")) return { act: "move", value: nextSnap(value, direction, rule) };
  if (direction)
    return { act: "move", value: step(value, direction, shiftKey ? "ten" : altKey ? "tenth" : "tick", rule) };
  if (key === "Home") return { act: "move", value: freeEnds(rule).min };
  if (key === "End") return { act: "move", value: freeEnds(rule).max };
  return key === "Escape" ? { act: "restore" } : null;
}

const begin = ({ key, altKey }: KeyPress): KeyAct | null =>
  !altKey && /^[\d.,\-−]$/.test(key) ? { act: "type", text: key } : null;
