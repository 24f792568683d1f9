import { render, screen } from "@testing-library/react";
import { describe, expect, it } from "vitest";
import { arc, drawStanding, standingTones, strokeUnit } from "@/components/standing/geometry";
import { Standing } from "@/components/standing/standing";
import { StandingGlyph } from "@/components/standing/standing-glyph";
import { type Standing as StandingName } from "@/lib/shots/schema-standing";
import { standings } from "@/lib/shots/schema-standing";

// Radii, widths in units of w, and points, read off the page that defines the rings.
const drawn: Record<StandingName, { strokes: [string, number][]; point?: number }> = {
  open: { strokes: [["ring 8.5", 1]] },
  rendering: {
    strokes: [
      ["arc 8.5 90 -60", 2.2],
      ["arc 8.5 -60 -270", 1],
    ],
  },
  stopped: {
    strokes: [
      ["arc 8.5 90 -60", 2.2],
      ["bar", 1.7],
    ],
  },
  ready: {
    strokes: [
      ["half 8.5", 1.5],
      ["horizon", 1],
    ],
  },
  "in review": { strokes: [["ring 8.5", 1]], point: 2.6 },
  returned: { strokes: [["arc 8.5 124 -124", 1.4]] },
  "signed off": { strokes: [["ring 8.25", 2]], point: 3 },
  delivered: {
    strokes: [
      ["ring 9.25", 1],
      ["ring 5.25", 1],
    ],
  },
  received: {
    strokes: [
      ["ring 9.25", 1],
      ["ring 5.75", 1],
    ],
    point: 2.6,
  },
  refused: {
    strokes: [
      ["arc 9.25 124 -124", 1],
      ["arc 5.25 124 -124", 1],
    ],
  },
  "on hold": {
    strokes: [
      ["arc 8.5 150 30", 1],
      ["arc 8.5 -30 -150", 1],
      ["bar", 1.7],
    ],
  },
  omitted: { strokes: [["ring 8.5", 1.25]] },
};

function pathOf(name: string): string {
  const [kind, radius = "0", from = "0", to = "0"] = name.split(" ");
  const r = Number(radius);
  if (kind === "bar") return "M7 12H17";
  if (kind === "horizon") return "M0.5 16H23.5";
  if (kind === "half") return "M3.5 16A8.5 8.5 0 0 1 20.5 16";
  if (kind === "ring") return `M${12 - r} 12a${r} ${r} 0 1 1 ${2 * r} 0a${r} ${r} 0 1 1 ${-2 * r} 0z`;
  return arc(r, Number(from), Number(to));
}

describe.each(standings)("the ring of %s", (standing) => {
  it.each([16, 24, 48])("has its drawn strokes at %d pixels", (size) => {
    const w = { 16: 2, 24: 1.6, 48: 1.15 }[size]!;
    const glyph = drawStanding(standing, size);
    expect(glyph.strokes.map(({ d }) => d)).toEqual(drawn[standing].strokes.map(([name]) => pathOf(name)));
    glyph.strokes.forEach(({ width }, index) =>
      expect(width).toBeCloseTo(drawn[standing].strokes[index]![1] * w, 9),
    );
    expect(glyph.point).toBe(drawn[standing].point);
  });

  it("is always shown with its word, and is silent beside it", () => {
    const { container } = render(<Standing standing={standing} />);
    expect(screen.getByText(standing)).toBeVisible();
    expect(container.querySelector("svg")).toHaveAttribute("aria-hidden", "true");
  });
});

it("tells every two standings apart by shape alone", () => {
  const shapes = standings.map((standing) => JSON.stringify(drawStanding(standing, 16)));
  expect(new Set(shapes).size).toBe(standings.length);
});

it("draws an arc clockwise from its first angle to its second", () => {
  expect(arc(8.5, 90, -60)).toBe("M12 3.5A8.5 8.5 0 0 1 16.25 19.361");
  expect(arc(8.5, 124, -124)).toMatch(/0 1 1/);
});

it("thins the stroke as the ring grows", () => {
  expect([12, 16, 20, 24, 36, 48, 96].map(strokeUnit).map((w) => Number(w.toFixed(4)))).toEqual([
    2, 2, 1.8, 1.6, 1.375, 1.15, 1.15,
  ]);
});

it("dots the unfinished part of rendering and dashes omitted in eight rounded strokes", () => {
  expect(drawStanding("rendering", 16).strokes[1]!.dash).toBe("1 3.2");
  const omitted = drawStanding("omitted", 16).strokes[0]!;
  expect(omitted).toMatchObject({ dash: "1.2 5.476", round: true });
  expect(8 * (1.2 + 5.476)).toBeCloseTo(2 * Math.PI * 8.5, 1);
});

it("asks for work in ember, settles in ice, and leaves the rest neutral", () => {
  const of = (tone: string) => standings.filter((standing) => standingTones[standing] === tone);
  expect(of("ember")).toEqual(["ready", "in review", "returned"]);
  expect(of("ice")).toEqual(["signed off", "delivered", "received"]);
  expect(of("text")).toEqual(["rendering"]);
});

it("turns only the ring of rendering", () => {
  const turning = standings.filter((standing) => {
    const { container, unmount } = render(<StandingGlyph standing={standing} />);
    const turns = container.querySelector("svg")!.classList.contains("animate-turn");
    unmount();
    return turns;
  });
  expect(turning).toEqual(["rendering"]);
});
