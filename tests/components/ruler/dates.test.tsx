import { render, screen } from "@testing-library/react";
import { describe, expect, it } from "vitest";
import { DateLane } from "@/components/ruler/date-lane";
import { DateRuler } from "@/components/ruler/date-ruler";
import { dayOf, sayDay, sayDays, sayLate, weekSteps } from "@/components/ruler/dates";
import { layLane } from "@/components/ruler/lane";

const span = { from: "2031-10-13", to: "2031-11-17", today: "2031-10-20" };

describe("a day", () => {
  it("is counted without regard to the reader's time zone", () => {
    expect(dayOf("1970-01-02")).toBe(1);
    expect(dayOf("2031-10-20") - dayOf("2031-10-13")).toBe(7);
    expect(dayOf("2031-10-20T12:00:00Z") - dayOf("2031-10-20")).toBe(0.5);
  });

  it("is said as the day and the month", () => {
    expect(sayDay(dayOf("2031-10-20T23:59:00Z"))).toBe("20 Oct");
    expect(sayDays(dayOf("2031-10-21"), dayOf("2031-10-22"))).toBe("21–22 Oct");
    expect(sayDays(dayOf("2031-10-30"), dayOf("2031-11-02"))).toBe("30 Oct–2 Nov");
    expect(sayDays(dayOf("2031-10-21"), dayOf("2031-10-21T18:00:00Z"))).toBe("21 Oct");
    expect([1, 3, 40].map(sayLate)).toEqual(["one day late", "three days late", "forty days late"]);
  });
});

describe("a lane", () => {
  it("shows a due date ahead at its place", () => {
    expect(layLane({ ...span, due: "2031-10-24" }).due).toEqual({
      at: 31.429,
      words: "24 Oct",
      look: "ahead",
    });
    expect(layLane({ ...span, due: "2031-10-24", duePrefix: "due" }).due?.words).toBe("due 24 Oct");
  });

  it("says how late it is, and is not late on the day itself", () => {
    expect(layLane({ ...span, due: "2031-10-17" }).due).toMatchObject({
      look: "late",
      words: "three days late, due 17 Oct",
    });
    expect(layLane({ ...span, due: "2031-10-20" }).due?.look).toBe("ahead");
    expect(layLane({ ...span, today: "2031-10-20T22:00:00Z", due: "2031-10-20" }).due?.look).toBe("ahead");
  });

  it("is never late once the date was kept", () => {
    expect(layLane({ ...span, due: "2031-10-15", met: true }).due).toMatchObject({
      look: "met",
      words: "15 Oct, met",
    });
  });

  it("keeps what lies beyond the ruler at its ends", () => {
    expect(layLane({ ...span, due: "2032-03-01" }).due?.at).toBe(100);
    expect(layLane({ ...span, due: "2031-01-01" }).due?.at).toBe(0);
    expect(layLane({ ...span, today: "2032-03-01" }).today).toBeNull();
  });

  it("says everything it draws in one sentence", () => {
    const forecast = { from: "2031-10-21", to: "2031-10-22", what: "frames" };
    render(<DateLane {...span} due="2031-10-28" sent="2031-10-18" forecast={forecast} />);
    expect(screen.getByRole("img", { name: "28 Oct; sent 18 Oct; frames, 21–22 Oct" })).toBeInTheDocument();
  });

  it("says so when there is no date", () => {
    render(<DateLane {...span} />);
    expect(screen.getByRole("img", { name: "no date" })).toBeInTheDocument();
  });
});

describe("the date ruler", () => {
  it("labels weeks from its first day and stands today in the place of its label", () => {
    render(<DateRuler {...span} todayWord="today" length={424} />);
    for (const words of ["13 Oct", "today", "27 Oct", "3 Nov", "10 Nov", "17 Nov"])
      expect(screen.getByText(words)).toBeInTheDocument();
    expect(screen.queryByText("20 Oct")).toBeNull();
  });

  it("takes more weeks between labels as the ruler shortens", () => {
    expect(weekSteps(35, 424).label).toBe(7);
    expect(weekSteps(35, 150).label).toBe(14);
    expect(weekSteps(365, 424)).toEqual({ label: 56, mid: 7, fine: 1 });
  });
});
