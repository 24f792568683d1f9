import { act, fireEvent, render, screen } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { useState } from "react";
import { describe, expect, it, vi } from "vitest";
import { DeviationRuler } from "@/components/ruler/deviation-ruler";
import { ProgressRuler } from "@/components/ruler/progress-ruler";
import { Ruler } from "@/components/ruler/ruler";

function RadiusRuler({ onCommit, start = 34 }: { onCommit?: (value: number) => void; start?: number }) {
  const [value, setValue] = useState(start);
  const index = {
    id: "camera",
    label: "camera radius",
    value,
    format: (radius: number) => `${radius.toFixed(1)} M`,
    speak: (radius: number) => `${radius.toFixed(1)} gravitational radii`,
    onChange: setValue,
    ...(onCommit ? { onCommit } : {}),
  };
  return (
    <Ruler
      label="radius, M"
      length={600}
      scale={{ kind: "log", from: 1.5, to: 100 }}
      snaps={[{ value: 8.717, label: "innermost stable orbit, retrograde" }]}
      hatched={[{ from: 1.5, to: 2.321, reason: "no stable orbit below 2.321 M", forbidden: true }]}
      indices={[index]}
    />
  );
}

const slider = () => screen.getByRole("slider", { name: "camera radius" });
const spoken = () => slider().getAttribute("aria-valuetext");

describe("an index that can be moved", () => {
  it("is a slider that speaks its value with its unit", () => {
    render(<RadiusRuler />);
    expect(screen.getByRole("group", { name: "radius, M" })).toContainElement(slider());
    expect(slider()).toHaveAttribute("aria-valuenow", "34");
    expect(slider()).toHaveAttribute("aria-valuemin", "1.5");
    expect(slider()).toHaveAttribute("aria-valuemax", "100");
    expect(spoken()).toBe("34.0 gravitational radii");
    expect(screen.getByText("34.0 M")).toBeInTheDocument();
  });

  it("moves by arrows, Shift, Alt, Page, Home and End, and Esc gives back what it was", async () => {
    render(<RadiusRuler />);
    const user = userEvent.setup();
    await user.tab();
    expect(slider()).toHaveFocus();
    const after = async (keys: string) => {
      await user.keyboard(keys);
      return slider().getAttribute("aria-valuenow");
    };
    expect(await after("{ArrowRight}")).toBe("36");
    expect(await after("{ArrowDown}")).toBe("34");
    expect(await after("{Alt>}{ArrowUp}{/Alt}")).toBe("34.2");
    expect(await after("{Shift>}{ArrowLeft}{/Shift}")).toBe("16.2");
    expect(await after("{PageDown}")).toBe("8.717");
    expect(await after("{Home}")).toBe("2.321");
    expect(await after("{End}")).toBe("100");
    expect(await after("{Escape}")).toBe("34");
  });

  it("takes typed digits on Enter, shows them meanwhile, and drops them on Esc", async () => {
    const onCommit = vi.fn();
    render(<RadiusRuler onCommit={onCommit} />);
    const user = userEvent.setup();
    await user.tab();
    await user.keyboard("12.5");
    expect(spoken()).toBe("typing 12.5");
    expect(screen.getByText("12.5|")).toBeInTheDocument();
    await user.keyboard("{Escape}");
    expect(spoken()).toBe("34.0 gravitational radii");
    await user.keyboard("12.5{Enter}");
    expect(spoken()).toBe("12.5 gravitational radii");
    expect(onCommit.mock.calls).toEqual([[12.5]]);
  });

  it("keeps typed digits when it is left, within the ruler", async () => {
    render(<RadiusRuler />);
    const user = userEvent.setup();
    await user.tab();
    await user.keyboard("1");
    await user.tab();
    expect(slider()).toHaveAttribute("aria-valuenow", "2.321");
  });

  it("follows the pointer, shows where it started, and commits once on release", () => {
    const onCommit = vi.fn();
    const { container } = render(<RadiusRuler onCommit={onCommit} />);
    fireEvent.pointerDown(slider(), { button: 0, pointerId: 1, clientX: 400 });
    expect(container.querySelector("[data-origin]")).toBeNull();
    fireEvent.pointerMove(slider(), { pointerId: 1, clientX: 300 });
    expect(container.querySelector("[data-origin]")).not.toBeNull();
    const dragged = Number(slider().getAttribute("aria-valuenow"));
    expect(dragged).toBeCloseTo(Math.sqrt(1.5 * 100), 0);
    expect(onCommit).not.toHaveBeenCalled();
    fireEvent.lostPointerCapture(slider(), { pointerId: 1 });
    expect(onCommit.mock.calls).toEqual([[dragged]]);
    fireEvent.pointerMove(slider(), { pointerId: 1, clientX: 100 });
    expect(slider()).toHaveAttribute("aria-valuenow", String(dragged));
    expect(container.querySelector("[data-origin]")).toBeNull();
  });

  it("goes back to its origin when Esc is pressed in the middle of a drag", () => {
    render(<RadiusRuler />);
    act(() => slider().focus());
    fireEvent.pointerDown(slider(), { button: 0, pointerId: 1 });
    fireEvent.pointerMove(slider(), { pointerId: 1, clientX: 300 });
    fireEvent.keyDown(slider(), { key: "Escape" });
    expect(slider()).toHaveAttribute("aria-valuenow", "34");
    fireEvent.pointerMove(slider(), { pointerId: 1, clientX: 200 });
    expect(slider()).toHaveAttribute("aria-valuenow", "34");
  });

  it("has a target of 24 by 24 pixels and a focus box of 22 by 27", async () => {
    const { container } = render(<RadiusRuler />);
    await userEvent.setup().tab();
    const sizeOf = (name: string) => {
      const box = container.querySelector(`[${name}]`)!;
      return [box.getAttribute("width"), box.getAttribute("height")];
    };
    expect(sizeOf("data-target")).toEqual(["24", "24"]);
    expect(sizeOf("data-focus-box")).toEqual(["22", "27"]);
  });
});

describe("a ruler that only shows", () => {
  const still = { id: "now", label: "frame", value: 1049, format: String };

  it("is one picture with its values in its name", () => {
    render(
      <Ruler
        label="frames"
        length={400}
        scale={{ kind: "linear", from: 1001, to: 1096 }}
        indices={[still]}
      />,
    );
    expect(screen.getByRole("img", { name: "frames: frame 1049" })).toBeInTheDocument();
    expect(screen.queryByRole("slider")).toBeNull();
  });

  it("draws the cut, the keys and the hatching with its reason", () => {
    const { container } = render(
      <Ruler
        label="frames"
        length={600}
        scale={{ kind: "linear", from: 993, to: 1104 }}
        cut={[1001, 1096]}
        keyed={[1001, 1049]}
        hatched={[{ from: 993, to: 1001, reason: "handles" }]}
      />,
    );
    expect(container.querySelectorAll("[data-cut]")).toHaveLength(2);
    const keys = [...container.querySelectorAll("[data-keyed]")];
    expect(keys.map((key) => [key.getAttribute("width"), key.getAttribute("height")])).toEqual([
      ["3", "8"],
      ["3", "8"],
    ]);
    expect(container.querySelector("[data-hatched] title")).toHaveTextContent("handles");
  });

  it("cannot be moved while disabled", () => {
    const moved = { ...still, onChange: vi.fn() };
    render(
      <Ruler
        disabled
        label="frames"
        length={400}
        scale={{ kind: "linear", from: 0, to: 10 }}
        indices={[moved]}
      />,
    );
    expect(screen.queryByRole("slider")).toBeNull();
  });
});

it("says how far something has come, in the unit that is counted", () => {
  render(
    <ProgressRuler
      label="gigabytes checked"
      value={49.6}
      max={72.4}
      spoken="49.6 of 72.4 gigabytes"
      length={300}
    />,
  );
  const bar = screen.getByRole("progressbar", { name: "gigabytes checked" });
  expect(bar).toHaveAttribute("aria-valuetext", "49.6 of 72.4 gigabytes");
  expect(bar).toHaveAttribute("aria-valuenow", "49.6");
});

describe("a deviation", () => {
  it("says whether it lies within the tolerance", () => {
    render(<DeviationRuler label="shadow, width" deviation={-0.38} />);
    expect(screen.getByRole("img", { name: "shadow, width: -0.38 tolerances, within" })).toBeInTheDocument();
  });

  it("points outward in ember when it is beyond the ruler", () => {
    const { container } = render(<DeviationRuler label="peak temperature" deviation={-40} />);
    const index = container.querySelector("[data-index]")!;
    expect(index).toHaveClass("fill-ember");
    expect(index.getAttribute("transform")).toMatch(/^translate\(0 /);
    expect(screen.getByRole("img", { name: /outside/ })).toBeInTheDocument();
  });
});
