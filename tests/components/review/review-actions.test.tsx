import { render, screen, waitFor } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import { ReviewActions, type ReviewActionsProps } from "@/components/review/review-actions";

const refresh = vi.hoisted(() => vi.fn());
vi.mock("next/navigation", () => ({ useRouter: () => ({ refresh }) }));

const asked: { path: string; body: unknown }[] = [];
beforeEach(() => {
  vi.stubGlobal("fetch", async (path: string, init: RequestInit) => {
    asked.push({ path, body: init.body ? JSON.parse(String(init.body)) : undefined });
    return Response.json({ after: "v-1" });
  });
});
afterEach(() => {
  asked.length = 0;
  vi.unstubAllGlobals();
  refresh.mockClear();
});

const version = {
  id: "id-4",
  number: 4,
  shotCode: "LH-020",
  digest: "7".repeat(64),
  standing: "ready",
  madeById: "a",
} as const;
const nobody = { role: null, mayGiveVerdict: false, maySend: false, mayWithdraw: false };
const show = (
  change: Partial<ReviewActionsProps["version"]>,
  viewer: Partial<ReviewActionsProps["viewer"]>,
) => render(<ReviewActions version={{ ...version, ...change }} viewer={{ ...nobody, ...viewer }} />);

describe("what can be done about a version's review", () => {
  it("is nothing for those who may do nothing, or while the frames are not all there", () => {
    expect(show({}, {}).container).toBeEmptyDOMElement();
    expect(show({ digest: null, standing: "rendering" }, { maySend: true }).container).toBeEmptyDOMElement();
  });

  it("sends with the words for the advisor, and asks for them first", async () => {
    const user = userEvent.setup();
    show({}, { maySend: true });
    await user.click(screen.getByRole("button", { name: "Send for review" }));
    await user.click(screen.getByRole("button", { name: "Send it for review" }));
    expect(screen.getByText("Say what the advisor should look at.")).toBeVisible();
    expect(asked).toEqual([]);
    await user.type(screen.getByLabelText("What should the advisor look at?"), "The bright edge.");
    await user.click(screen.getByRole("button", { name: "Send it for review" }));
    await waitFor(() => expect(refresh).toHaveBeenCalled());
    expect(asked).toEqual([{ path: "/api/versions/id-4/submission", body: { words: "The bright edge." } }]);
  });

  it("leads the advisor to the declaration", () => {
    show({ standing: "in review" }, { mayGiveVerdict: true });
    expect(screen.getByRole("link", { name: "Give a verdict" })).toHaveAttribute(
      "href",
      "/versions/id-4/verdict",
    );
  });

  it("withdraws a sign-off with words, past no verdict the advisor had not seen", async () => {
    const user = userEvent.setup();
    show({ standing: "delivered" }, { mayWithdraw: true });
    await user.click(screen.getByRole("button", { name: "Withdraw the verdict" }));
    expect(screen.getByText(/Downloads of deliveries that hold them stop at once/)).toBeVisible();
    await user.type(screen.getByLabelText("Why is it withdrawn?"), "The edge.");
    await user.click(screen.getByRole("button", { name: "Withdraw the sign-off" }));
    await waitFor(() => expect(refresh).toHaveBeenCalled());
    expect(asked.at(-1)).toEqual({
      path: "/api/versions/id-4/verdicts/withdrawal",
      body: { words: "The edge.", after: "v-1" },
    });
  });
});
