import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { valueUnderPointer } from "@/components/ruler/drag";
import { actOnKey, type KeyPress, readTyped } from "@/components/ruler/keys";
import { constrain, freeEnds, type IndexRule, logTick, plainRule, step } from "@/components/ruler/rule";
import { placeScale } from "@/components/ruler/scale";

const radius: IndexRule = {
  ...plainRule({ kind: "log", from: 1.5, to: 100 }, 1),
  snaps: [1.558, 2.321, 8.717],
  forbidden: [{ from: 1.5, to: 2.321 }],
};
const frames: IndexRule = { ...plainRule({ kind: "linear", from: 1001, to: 1096 }, 1), whole: true };
const press = (key: string, held: Partial<KeyPress> = {}): KeyPress => ({
  key,
  shiftKey: false,
  altKey: false,
  ctrlKey: false,
  metaKey: false,
  ...held,
});

describe("an index", () => {
  it("never stands in forbidden ground, wherever it is sent", () => {
    const holed: IndexRule = { ...radius, forbidden: [...radius.forbidden, { from: 20, to: 30 }] };
    fc.assert(
      fc.property(fc.double({ min: -1e3, max: 1e4, noNaN: true }), (value) => {
        const place = constrain(value, holed);
        expect(place).toBeGreaterThanOrEqual(2.321);
        expect(place).toBeLessThanOrEqual(100);
        expect(place > 20 && place < 30).toBe(false);
      }),
      { seed: 3 },
    );
  });

  it("ends where forbidden ground that reaches the ruler's end begins", () => {
    expect(freeEnds(radius)).toEqual({ min: 2.321, max: 100 });
  });

  it("moves by the ticks that are drawn: tenths, fifths, halves of a decade's unit", () => {
    expect([1.5, 3, 7, 15, 30, 70].map((value) => logTick(value, 1))).toEqual([0.1, 0.2, 0.5, 1, 2, 5]);
    expect(logTick(2, -1)).toBeCloseTo(0.1, 12);
    expect(logTick(2, 1)).toBeCloseTo(0.2, 12);
  });

  it("moves one tick with an arrow, ten with Shift, a tenth with Alt", () => {
    expect(step(34, 1, "tick", radius)).toBe(36);
    expect(step(34, -1, "tenth", radius)).toBe(33.8);
    expect(step(34, 1, "ten", radius)).toBe(60);
    expect(step(1049, 1, "ten", frames)).toBe(1059);
  });

  it("never divides a frame", () => {
    expect(step(1049, 1, "tenth", frames)).toBe(1050);
    expect(constrain(1049.4, frames)).toBe(1049);
  });
});

describe("a key", () => {
  it("moves to the next snap mark that may be stood on, else to the end", () => {
    expect(actOnKey(press("PageUp"), 3, null, radius)).toEqual({ act: "move", value: 8.717 });
    expect(actOnKey(press("PageDown"), 3, null, radius)).toEqual({ act: "move", value: 2.321 });
    expect(actOnKey(press("PageUp"), 50, null, radius)).toEqual({ act: "move", value: 100 });
  });

  it("goes to the free ends with Home and End", () => {
    expect(actOnKey(press("Home"), 34, null, radius)).toEqual({ act: "move", value: 2.321 });
    expect(actOnKey(press("End"), 34, null, radius)).toEqual({ act: "move", value: 100 });
  });

  it("types digits, and writes them on Enter within the ruler", () => {
    expect(actOnKey(press("3"), 34, null, radius)).toEqual({ act: "type", text: "3" });
    expect(actOnKey(press("5"), 34, "3", radius)).toEqual({ act: "type", text: "35" });
    expect(actOnKey(press("Enter"), 34, "350", radius)).toEqual({ act: "write", value: 100 });
    expect(actOnKey(press("Backspace"), 34, "35", radius)).toEqual({ act: "type", text: "3" });
  });

  it("abandons what was typed with Esc, and otherwise restores", () => {
    expect(actOnKey(press("Escape"), 34, "12", radius)).toEqual({ act: "abandon" });
    expect(actOnKey(press("Escape"), 34, null, radius)).toEqual({ act: "restore" });
  });

  it("leaves Tab, letters and the browser's own shortcuts alone", () => {
    expect(actOnKey(press("Tab"), 34, null, radius)).toBeNull();
    expect(actOnKey(press("k"), 34, null, radius)).toBeNull();
    expect(actOnKey(press("ArrowLeft", { metaKey: true }), 34, null, radius)).toBeNull();
    expect(actOnKey(press("1", { ctrlKey: true }), 34, null, radius)).toBeNull();
  });

  it("reads numbers with a comma, a true minus sign or an exponent, and nothing else", () => {
    expect(["2,5", "−3", "4.2e7", "", "1.2.3", "-"].map(readTyped)).toEqual([
      2.5,
      -3,
      4.2e7,
      null,
      null,
      null,
    ]);
  });
});

describe("a pointer", () => {
  const placement = placeScale({ kind: "log", from: 1.5, to: 100 }, 600);

  it("is drawn to a snap mark within six pixels, unless held free", () => {
    const near = placement.at(8.717) + 5;
    expect(valueUnderPointer(near, placement, radius)).toBe(8.717);
    expect(valueUnderPointer(near, placement, radius, true)).not.toBe(8.717);
    expect(valueUnderPointer(placement.at(8.717) + 8, placement, radius)).not.toBe(8.717);
  });

  it("reads no finer than a tenth of a tick, and stays on the line", () => {
    expect(valueUnderPointer(placement.at(34.07), placement, radius)).toBe(34);
    expect(valueUnderPointer(9999, placement, radius)).toBe(100);
    expect(valueUnderPointer(-50, placement, radius)).toBe(2.321);
  });
});
