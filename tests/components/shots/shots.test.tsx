import { render, screen, waitFor, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { withNuqsTestingAdapter } from "nuqs/adapters/testing";
import { beforeEach, describe, expect, it, vi } from "vitest";
import { ChoiceBar } from "@/components/shots/choice-bar";
import { chooseDates } from "@/components/shots/date-range";
import { FilterSentence } from "@/components/shots/filter-sentence";
import { sayDuration, sayShots } from "@/components/shots/say";
import { sayGroup, ShotTable } from "@/components/shots/shot-table";
import type { ShotLine, ShotList } from "@/lib/shots/schema";

const router = vi.hoisted(() => ({ refresh: vi.fn() }));
vi.mock("next/navigation", () => ({ useRouter: () => router }));

const line = (code: string, change: Partial<ShotLine> = {}): ShotLine => ({
  id: `id-${code}`,
  code,
  brief: "A rim of light.",
  standing: "open",
  version: null,
  picture: null,
  holder: { kind: "nobody" },
  dueOn: null,
  milliseconds: 0,
  ...change,
});

const list = (shots: ShotLine[]): ShotList => ({
  production: { id: "p1", code: "AB", name: "The Lantern Reef" },
  productions: [{ id: "p1", name: "The Lantern Reef" }],
  today: "2031-10-20",
  groups: [{ id: "g1", number: 1, name: "Approach", shotCount: 3, shots }],
  sequences: [{ id: "g1", number: 1, name: "Approach" }],
  totals: { shots: 3, asking: 1, late: 0, milliseconds: 5_400_000 },
  holders: [{ id: "wen", name: "Wen Halloway" }],
  artists: [{ id: "wen", name: "Wen Halloway" }],
  mayChange: true,
});

describe("the headline", () => {
  it.each([
    [{ shots: 11, asking: 3, late: 1 }, "Eleven shots; three ask for work, one is late."],
    [{ shots: 1, asking: 1, late: 0 }, "One shot; one asks for work."],
    [{ shots: 14, asking: 0, late: 2 }, "Fourteen shots; none asks for work, two are late."],
    [{ shots: 0, asking: 0, late: 0 }, "No shots yet."],
  ])("says %o in a sentence", (totals, sentence) => {
    expect(sayShots({ ...totals, milliseconds: 0 })).toBe(sentence);
  });

  it.each([
    [0, "0 s"],
    [1_250, "1.3 s"],
    [42_000, "42 s"],
    [204_000, "3.4 min"],
    [2_880_000, "48 min"],
    [183_240_000, "50.9 h"],
  ])("says %s milliseconds as %s", (milliseconds, said) => {
    expect(sayDuration(milliseconds)).toBe(said);
  });
});

describe("the dates", () => {
  it("span whole weeks from today, with every due date that is not far off", () => {
    const due = ["2031-10-04", "2031-11-20"].map((dueOn) => ({ dueOn }));
    expect(chooseDates(due, "2031-10-20")).toEqual({ from: "2031-09-29", to: "2031-11-24" });
    expect(chooseDates([], "2031-10-20")).toEqual({ from: "2031-10-13", to: "2031-11-17" });
    expect(chooseDates([{ dueOn: "2020-01-01" }], "2031-10-20").from).toBe("2031-09-08");
  });
});

describe("the table", () => {
  const dates = { from: "2031-10-13", to: "2031-11-17", today: "2031-10-20" };
  const shots = [
    line("AB-010", {
      standing: "in review",
      version: { id: "v4", number: 4 },
      holder: { kind: "person", id: "imke", name: "Imke Varandel" },
      dueOn: "2031-10-17",
    }),
    line("AB-020", { standing: "rendering", holder: { kind: "queue" } }),
  ];

  it("gives each shot its standing, version, holder and date, and leads to it", () => {
    render(<ShotTable list={list(shots)} dates={dates} chosen={new Set()} />);
    const row = screen.getByRole("row", { name: /AB-010/ });
    expect(within(row).getByText("in review")).toBeTruthy();
    expect(within(row).getByText("Imke Varandel")).toBeTruthy();
    expect(within(row).getByRole("img", { name: "three days late, due 17 Oct" })).toBeTruthy();
    expect(within(row).getByRole("link", { name: "AB-010" }).getAttribute("href")).toBe(
      "/shots/id-AB-010/bench",
    );
    expect(within(row).getByRole("link", { name: "version 4 of AB-010" }).getAttribute("href")).toBe(
      "/versions/v4",
    );
    expect(screen.getByText("render queue")).toBeTruthy();
    expect(screen.queryByRole("checkbox")).toBeNull();
  });

  it("lets a producer choose rows", async () => {
    const choose = vi.fn();
    render(<ShotTable list={list(shots)} dates={dates} chosen={new Set()} onChoose={choose} />);
    await userEvent.click(screen.getByRole("checkbox", { name: "Choose AB-020" }));
    expect(choose).toHaveBeenCalledWith("id-AB-020", true);
  });

  it("says how many of a sequence's shots a filter hides", () => {
    const [group] = list(shots).groups;
    expect(sayGroup(group!)).toBe("sequence 1, three shots, 2 shown");
    expect(sayGroup({ ...group!, shots: [] })).toBe("sequence 1, three shots, none shown");
  });
});

describe("the filter sentence", () => {
  it("puts the chosen word into the address", async () => {
    const onUrlUpdate = vi.fn<(event: { queryString: string }) => void>();
    render(<FilterSentence list={list([])} />, { wrapper: withNuqsTestingAdapter({ onUrlUpdate }) });
    await userEvent.click(screen.getByRole("button", { name: "who has them: anyone" }));
    await userEvent.click(await screen.findByRole("menuitemradio", { name: "Wen Halloway" }));
    await waitFor(() => expect(onUrlUpdate).toHaveBeenCalled());
    expect(onUrlUpdate.mock.calls.at(-1)?.[0].queryString).toBe("?holder=wen");
  });
});

describe("the sentence that acts on chosen shots", () => {
  const asked: unknown[] = [];
  let status = 200;
  beforeEach(() => {
    asked.length = 0;
    status = 200;
    vi.stubGlobal("fetch", async (_path: string, { body }: RequestInit) => {
      asked.push(JSON.parse(String(body)));
      const error = { code: "conflict", message: "AB-010 is on hold already." };
      return Response.json(status === 200 ? { changed: 1 } : { error }, { status });
    });
  });

  it("names the shots, and puts them on hold", async () => {
    const done = vi.fn();
    render(<ChoiceBar chosen={[line("AB-010"), line("AB-020")]} artists={[]} onDone={done} />);
    expect(screen.getByText("Two shots chosen, AB-010, AB-020:")).toBeTruthy();
    await userEvent.click(screen.getByRole("button", { name: "put them on hold" }));
    await waitFor(() => expect(done).toHaveBeenCalled());
    expect(asked).toEqual([{ shots: ["id-AB-010", "id-AB-020"], change: { what: "hold", hold: "on hold" } }]);
  });

  it("tells the second of two people that the first was quicker", async () => {
    status = 409;
    const done = vi.fn();
    render(<ChoiceBar chosen={[line("AB-010")]} artists={[]} onDone={done} />);
    await userEvent.click(screen.getByRole("button", { name: "put it on hold" }));
    expect((await screen.findByRole("alert")).textContent).toBe("AB-010 is on hold already.");
    expect(done).not.toHaveBeenCalled();
  });

  it("takes up again what rests, and does not offer it for what does not", () => {
    const { rerender } = render(
      <ChoiceBar chosen={[line("AB-010", { standing: "on hold" })]} artists={[]} onDone={() => undefined} />,
    );
    expect(screen.getByRole("button", { name: "take it up again" })).toBeTruthy();
    expect(screen.queryByRole("button", { name: "put it on hold" })).toBeNull();
    rerender(<ChoiceBar chosen={[line("AB-010")]} artists={[]} onDone={() => undefined} />);
    expect(screen.queryByRole("button", { name: "take it up again" })).toBeNull();
  });
});
