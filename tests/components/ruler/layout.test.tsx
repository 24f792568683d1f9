import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { layFrame, pointAt } from "@/components/ruler/frame";
import { placeScale, type RulerScale, snapToHalf } from "@/components/ruler/scale";
import { closest, layTicks } from "@/components/ruler/ticks";

const logScale = (from: number, to: number): RulerScale => ({ kind: "log", from, to });
const linearScale = (from: number, to: number): RulerScale => ({ kind: "linear", from, to });
const labels = (scale: RulerScale, length: number) =>
  layTicks(placeScale(scale, length)).flatMap(({ label }) => label ?? []);

const anyScale = fc.oneof(
  fc
    .record({
      from: fc.double({ min: 0.01, max: 50, noNaN: true }),
      ratio: fc.double({ min: 1.5, max: 1e7, noNaN: true }),
    })
    .map(({ from, ratio }) => logScale(from, from * ratio)),
  fc
    .record({ from: fc.integer({ min: -5000, max: 5000 }), span: fc.integer({ min: 2, max: 20000 }) })
    .map(({ from, span }) => linearScale(from, from + span)),
);

describe("any ruler", () => {
  it("never lets two ticks stand closer than three pixels", () => {
    fc.assert(
      fc.property(anyScale, fc.integer({ min: 24, max: 1400 }), (scale, length) => {
        const places = layTicks(placeScale(scale, length)).map(({ at }) => at);
        for (let i = 1; i < places.length; i++)
          expect(places[i]! - places[i - 1]!).toBeGreaterThanOrEqual(closest);
      }),
      { seed: 7, numRuns: 300 },
    );
  });

  it("puts every tick on the middle of a pixel, within half a pixel of its value", () => {
    fc.assert(
      fc.property(anyScale, fc.integer({ min: 24, max: 1400 }), (scale, length) => {
        const placement = placeScale(scale, length);
        for (const { at, value } of layTicks(placement)) {
          expect(at % 1).toBeCloseTo(at < 0 ? -0.5 : 0.5, 9);
          expect(Math.abs(at - placement.at(value))).toBeLessThanOrEqual(0.5 + 1e-6);
        }
      }),
      { seed: 11, numRuns: 200 },
    );
  });

  it("never writes one label into another", () => {
    fc.assert(
      fc.property(anyScale, fc.integer({ min: 24, max: 1400 }), (scale, length) => {
        const labelled = layTicks(placeScale(scale, length)).filter(({ label }) => label !== undefined);
        for (let i = 1; i < labelled.length; i++) {
          const [a, b] = [labelled[i - 1]!, labelled[i]!];
          expect(b.at - a.at).toBeGreaterThan(((a.label!.length + b.label!.length) * 6.3) / 2);
        }
      }),
      { seed: 13, numRuns: 200 },
    );
  });

  it("gives back the value it placed", () => {
    fc.assert(
      fc.property(anyScale, fc.double({ min: 0, max: 1, noNaN: true }), (scale, share) => {
        const { at, valueAt } = placeScale(scale, 624);
        expect(at(valueAt(share * 624))).toBeCloseTo(share * 624, 2);
      }),
      { seed: 17 },
    );
  });
});

it("places values to a thousandth of a pixel, so that a server and a browser draw the same", () => {
  const { at } = placeScale(logScale(0.25, 2), 480);
  expect([0.25, 0.5, 0.7, 2].map(at)).toEqual([0, 160, 237.668, 480]);
});

describe("a logarithmic ruler", () => {
  const ticks = layTicks(placeScale(logScale(1.4359, 100), 624));
  const lengthAt = (value: number) => ticks.find((tick) => Math.abs(tick.value - value) < 1e-9)?.length;

  it("labels ones, twos and fives", () => {
    expect(labels(logScale(1.4359, 100), 624)).toEqual(["2", "5", "10", "20", "50", "100"]);
    expect(labels(logScale(0.2, 3), 400)).toEqual(["0.2", "0.5", "1", "2"]);
  });

  it("gives 13 px to labelled ticks, 8 to whole steps of a decade and 4.5 to finer ones", () => {
    expect([2, 5, 10, 20, 50, 100].map(lengthAt)).toEqual([13, 13, 13, 13, 13, 13]);
    expect([3, 4, 6, 7, 8, 9, 30, 40, 60].map(lengthAt)).toEqual([8, 8, 8, 8, 8, 8, 8, 8, 8]);
    expect([1.5, 1.9, 2.2, 4.8, 5.5, 11, 22, 55].map(lengthAt)).toEqual(Array(8).fill(4.5));
  });

  it("keeps the long ticks when a short ruler has no room for the fine ones", () => {
    const short = layTicks(placeScale(logScale(1, 1e6), 180));
    expect(short.filter(({ length }) => length === 13).length).toBeGreaterThanOrEqual(18);
    expect(short.some(({ length }) => length === 4.5)).toBe(false);
  });
});

describe("a linear ruler", () => {
  it("counts frames from the shot's first and shows every frame where there is room", () => {
    const placement = placeScale(linearScale(993, 1104), 624);
    const ticks = layTicks(placement, { steps: { label: 24, mid: 12, fine: 1, origin: 1001 } });
    expect(ticks.flatMap(({ label }) => label ?? [])).toEqual(["1001", "1025", "1049", "1073", "1097"]);
    expect(ticks).toHaveLength(112);
    expect(ticks.filter(({ length }) => length === 8).map(({ value }) => value)).toEqual([
      1013, 1037, 1061, 1085,
    ]);
  });

  it("takes fewer fine ticks, evenly, where there is none", () => {
    const ticks = layTicks(placeScale(linearScale(1001, 1097), 120), {
      steps: { label: 24, mid: 12, fine: 1, origin: 1001 },
    });
    const gaps = new Set(ticks.slice(1).map((tick, index) => tick.value - ticks[index]!.value));
    expect(gaps).toEqual(new Set([3]));
  });

  it("leaves a label out where a value stands in its row", () => {
    const placement = placeScale(linearScale(0, 100), 500);
    const ticks = layTicks(placement, { steps: { label: 20 }, taken: [{ at: placement.at(41), width: 20 }] });
    expect(ticks.flatMap(({ label }) => label ?? [])).toEqual(["0", "20", "60", "80", "100"]);
  });

  it("may run backwards, as an angle's does down a picture", () => {
    const ticks = layTicks(placeScale(linearScale(10, -10), 400), { steps: { label: 5, fine: 1 } });
    expect(ticks[0]).toMatchObject({ value: 10, at: 0.5 });
    expect(ticks.at(-1)).toMatchObject({ value: -10 });
  });
});

describe("what stands about the line", () => {
  const frame = (hang: "down" | "up", longTicks: boolean, labelSide: "beneath" | "above") =>
    layFrame({ vertical: false, hang, labelSide, valueSide: "above", longTicks });

  it("puts figures 25 below long ticks, 20 below middle ones, 17 above ticks that rise", () => {
    expect(frame("down", true, "beneath").labelOff).toBe(25);
    expect(frame("down", false, "beneath").labelOff).toBe(20);
    expect(frame("up", true, "above").labelOff).toBe(-17);
  });

  it("turns a vertical ruler's ticks to the left of its line", () => {
    const vertical = layFrame({
      vertical: true,
      hang: "down",
      labelSide: "beneath",
      valueSide: "above",
      longTicks: true,
    });
    expect(pointAt(vertical, 40, 13)).toEqual({ x: vertical.base + 0.5 - 13, y: 40 });
  });

  it("snaps to the middle of the nearest pixel", () => {
    expect([0, 0.4, 0.99, 1, 7.5].map(snapToHalf)).toEqual([0.5, 0.5, 0.5, 1.5, 7.5]);
  });
});
