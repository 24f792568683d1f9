import { render, screen, waitFor, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { beforeEach, describe, expect, it, vi } from "vitest";
import { BenchPage } from "@/components/bench/bench-page";
import type { BenchPage as Page } from "@/lib/setups/schema";
import { defaultSetup } from "@/render/scene/setup";

const router = vi.hoisted(() => ({ push: vi.fn(), refresh: vi.fn() }));
vi.mock("next/navigation", () => ({ useRouter: () => router }));
// jsdom has no event stream; what it brings is tested where it is made.
vi.mock("@/components/live/use-changes", () => ({ useChanges: () => undefined }));

const page: Page = {
  shot: { id: "s1", code: "AB-010", brief: "A rim of light.", hold: "none", dueOn: null },
  production: { id: "p1", name: "The Lantern Reef" },
  sequence: "Approach",
  artist: null,
  setup: defaultSetup,
  revision: 3,
  savedAt: "2031-10-20T08:42:00Z",
  savedBy: "Wen Halloway",
  versions: [],
  reader: { id: "r1", timeZone: "UTC" },
  may: { save: true, render: true },
};

type Answer = { status: number; body: unknown };
const asked: { path: string; method: string; body: Record<string, unknown> | undefined }[] = [];
let answer: (path: string, method: string) => Answer;

beforeEach(() => {
  asked.length = 0;
  router.push.mockReset();
  answer = () => ({ status: 200, body: { revision: 4, savedAt: "2031-10-20T09:00:00Z" } });
  vi.stubGlobal("fetch", async (path: string, { method = "GET", body }: RequestInit) => {
    asked.push({
      path,
      method,
      body: body ? (JSON.parse(String(body)) as Record<string, unknown>) : undefined,
    });
    const { status, body: said } = answer(path, method);
    return Response.json(said, { status });
  });
});

const field = (name: string) => screen.getByRole("textbox", { name });
const write = async (name: string, text: string) => {
  await userEvent.clear(field(name));
  if (text) await userEvent.type(field(name), text);
};

describe("the bench", () => {
  it("says when the setup was saved, and saves a change by itself on the revision it was made on", async () => {
    render(<BenchPage page={page} />);
    expect(screen.getByRole("status").textContent).toBe("Saved 08:42 by Wen Halloway");
    await write("spin a", "0.9");
    await waitFor(() => expect(screen.getByRole("status").textContent).toBe("Saved 09:00"), {
      timeout: 4000,
    });
    expect(asked).toHaveLength(1);
    expect(asked[0]).toMatchObject({ path: "/api/shots/s1/setup", method: "PUT", body: { revision: 3 } });
    expect(asked[0]!.body).toMatchObject({ setup: { hole: { spin: 0.9 } } });
  });

  it("says beside the field why a value cannot be, saves nothing of it, and renders nothing", async () => {
    render(<BenchPage page={page} />);
    await write("radius", "1.5");
    expect(await screen.findByText(/inside the horizon/)).toBeTruthy();
    await waitFor(
      () => expect(screen.getByRole("status").textContent).toMatch(/^Not saved: a value cannot be/),
      {
        timeout: 4000,
      },
    );
    expect(asked).toEqual([]);
    expect(screen.getByRole<HTMLButtonElement>("button", { name: "Render a version" }).disabled).toBe(true);
  });

  it("shows at once that one value forbids another", async () => {
    render(<BenchPage page={page} />);
    await userEvent.selectOptions(screen.getByRole("combobox", { name: "worldline" }), "circular-orbit");
    expect(await screen.findByText(/inclination must be 90°/)).toBeTruthy();
  });

  it("keeps the reader's values when someone saved first, and saves them over the other's when asked to", async () => {
    const words = "Tavi Orsolane saved this setup at 10:42; your change was not saved.";
    answer = () => ({ status: 409, body: { error: { code: "conflict", message: words } } });
    render(<BenchPage page={page} />);
    await write("spin a", "0.9");
    expect(await screen.findByText(new RegExp(words), {}, { timeout: 4000 })).toBeTruthy();
    expect((field("spin a") as HTMLInputElement).value).toBe("0.9");

    answer = (_path, method) =>
      method === "GET"
        ? { status: 200, body: { ...page, revision: 8 } }
        : { status: 200, body: { revision: 9, savedAt: "2031-10-20T10:43:00Z" } };
    await userEvent.click(screen.getByRole("button", { name: "save mine over them" }));
    await waitFor(() => expect(screen.getByRole("status").textContent).toBe("Saved 10:43"));
    expect(asked.at(-1)?.body).toMatchObject({ revision: 8, setup: { hole: { spin: 0.9 } } });
  });

  it("saves what is not saved yet before it renders, and goes to the new version", async () => {
    answer = (path) =>
      path.endsWith("/versions")
        ? { status: 200, body: { id: "v1", number: 1 } }
        : { status: 200, body: { revision: 4, savedAt: "2031-10-20T09:00:00Z" } };
    render(<BenchPage page={page} />);
    await write("spin a", "0.9");
    await userEvent.click(screen.getByRole("button", { name: "Render a version" }));
    await waitFor(() => expect(router.push).toHaveBeenCalledWith("/versions/v1"));
    const renders = asked.filter(({ path }) => path.endsWith("/versions"));
    expect(renders.map(({ body }) => body)).toEqual([
      { revision: 4, quality: "proof", colourSpace: "rec709", first: 1001, last: 1024 },
    ]);
  });

  it("asks for quality and frames, and refuses frames the setup does not have", async () => {
    render(<BenchPage page={page} />);
    await userEvent.click(screen.getByRole("button", { name: "quality and frames" }));
    const dialog = screen.getByRole("dialog");
    await userEvent.click(within(dialog).getByRole("radio", { name: /Master/ }));
    const last = within(dialog).getByRole("textbox", { name: "last frame" });
    await userEvent.clear(last);
    await userEvent.type(last, "1030");
    expect(within(dialog).getByText("A whole frame number between 1001 and 1024.")).toBeTruthy();
    await userEvent.clear(last);
    await userEvent.type(last, "1004");
    await userEvent.click(within(dialog).getByRole("button", { name: "Choose these" }));
    const bar = screen.getByRole("region", { name: "Render a version" });
    expect(bar.textContent).toContain("Version 1, master, four light paths a pixel, frames 1001–1004 (4)");
  });

  it("can be read and not changed by anyone but an artist", () => {
    render(<BenchPage page={{ ...page, may: { save: false, render: false } }} />);
    expect((field("spin a") as HTMLInputElement).readOnly).toBe(true);
    expect(screen.getByRole<HTMLSelectElement>("combobox", { name: "worldline" }).disabled).toBe(true);
    expect(screen.queryByRole("button", { name: "Render a version" })).toBeNull();
    expect(screen.getByText("Only an artist of this production changes the setup.")).toBeTruthy();
  });

  it("says why a shot on hold is not rendered", () => {
    render(<BenchPage page={{ ...page, shot: { ...page.shot, hold: "on hold" } }} />);
    expect(screen.getByText("The shot is on hold; a producer can take it up again.")).toBeTruthy();
  });
});
