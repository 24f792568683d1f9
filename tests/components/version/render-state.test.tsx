import { render, screen, waitFor } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { beforeEach, describe, expect, it, vi } from "vitest";
import { RenderState } from "@/components/version/render-state";
import type { RenderFacts, VersionPage } from "@/lib/versions/schema";
import { defaultSetup } from "@/render/scene/setup";

const router = vi.hoisted(() => ({ refresh: vi.fn() }));
vi.mock("next/navigation", () => ({ useRouter: () => router }));
vi.mock("@/components/live/use-changes", () => ({ useChanges: () => undefined }));

const facts: RenderFacts = {
  state: "rendering",
  attempt: 1,
  failedFrame: null,
  failure: null,
  changedAt: "2031-10-20T08:00:00Z",
  milliseconds: 204_000,
  unresolved: 0,
};

const version = (change: Partial<RenderFacts>, more: Partial<VersionPage> = {}): VersionPage => ({
  id: "v1",
  number: 1,
  production: { id: "p1", name: "The Lantern Reef" },
  shot: { id: "s1", code: "AB-010", brief: "A rim of light." },
  standing: "rendering",
  newer: null,
  setup: defaultSetup,
  setupDigest: "0".repeat(64),
  kernel: "p1.0",
  kernelHere: "p1.0",
  quality: "proof",
  colourSpace: "rec709",
  channels: "RGBA half",
  first: 1001,
  last: 1008,
  maker: { id: "m1", name: "Wen Halloway" },
  madeAt: "2031-10-20T08:00:00Z",
  render: { ...facts, ...change },
  finished: [{ first: 1001, last: 1003 }],
  seal: null,
  sent: null,
  history: [],
  setupFacts: [],
  viewer: {
    timeZone: "UTC",
    role: "artist",
    mayCancel: true,
    mayResume: true,
    maySend: true,
    mayGiveVerdict: false,
    mayWithdraw: false,
  },
  ...more,
});

const asked: string[] = [];
beforeEach(() => {
  asked.length = 0;
  vi.stubGlobal("fetch", async (path: string, { method }: RequestInit) => {
    asked.push(`${method} ${path}`);
    return Response.json(null);
  });
});

describe("how a version's rendering stands", () => {
  it("counts the frames while it goes on, and can be cancelled", async () => {
    render(<RenderState version={version({})} />);
    expect(screen.getByText(/3 of 8 frames rendered, 3.4 min of machine time/)).toBeTruthy();
    expect(screen.getByRole("progressbar").getAttribute("aria-valuetext")).toBe("3 of 8 frames");
    await userEvent.click(screen.getByRole("button", { name: "Cancel the rendering" }));
    await waitFor(() => expect(router.refresh).toHaveBeenCalled());
    expect(asked).toEqual(["POST /api/versions/v1/cancel"]);
  });

  it("says which frame failed and why, what is kept, and can be resumed", async () => {
    const failure = "There is no room left where finished frames are kept. Make room, then resume.";
    const { container } = render(
      <RenderState version={version({ state: "failed", failedFrame: 1004, failure })} />,
    );
    expect(container.textContent).toContain(
      `The rendering stopped at frame 1004. ${failure} 3 of 8 frames are kept.`,
    );
    await userEvent.click(screen.getByRole("button", { name: "Resume" }));
    await waitFor(() => expect(asked).toEqual(["POST /api/versions/v1/resume"]));
  });

  it("says why a version of another kernel cannot be resumed", () => {
    const other = version({ state: "cancelled" }, { kernelHere: "p1.1" });
    const viewer = { ...other.viewer, mayResume: false };
    const { container } = render(<RenderState version={{ ...other, viewer }} />);
    expect(container.textContent).toContain("begun with kernel p1.0 and the studio now has p1.1");
    expect(screen.queryByRole("button", { name: "Resume" })).toBeNull();
  });

  it("says nothing once the version is whole", () => {
    const { container } = render(<RenderState version={version({ state: "complete" })} />);
    expect(container.textContent).toBe("");
  });
});
