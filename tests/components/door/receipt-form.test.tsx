import { render, screen, waitFor } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import { ReceiptForm } from "@/components/door/receipt-form";
import type { DoorPage } from "@/lib/deliveries/schema-pages";

const refresh = vi.hoisted(() => vi.fn());
vi.mock("next/navigation", () => ({ useRouter: () => ({ refresh }) }));

const manifestDigest = `b41f07d2${"0".repeat(48)}3c9e66a8`;
const door = {
  id: "d-1",
  manifestDigest,
  reader: { name: "Odile Karsmark", timeZone: "UTC" },
} as unknown as DoorPage;

const asked: unknown[] = [];
beforeEach(() => {
  vi.stubGlobal("fetch", async (path: string, init: RequestInit) => {
    asked.push({ path, body: JSON.parse(String(init.body)) });
    return Response.json({});
  });
});
afterEach(() => {
  asked.length = 0;
  refresh.mockClear();
  vi.unstubAllGlobals();
});

describe("the receipt", () => {
  it("is one sentence with the digest, signed under the whole of it", async () => {
    render(<ReceiptForm door={door} files={212} isTaken />);
    expect(screen.getByText(/have received/)).toHaveTextContent(
      "I, Odile Karsmark, have received 212 files, each as it was signed, under digest b41f07d2 … 3c9e66a8.",
    );
    await userEvent.click(screen.getByRole("button", { name: "Sign the receipt" }));
    await waitFor(() => expect(refresh).toHaveBeenCalled());
    expect(asked).toEqual([
      { path: "/api/deliveries/d-1/receipt", body: { kind: "received", words: "", manifestDigest } },
    ]);
  });

  it("waits until something was taken, and says so", () => {
    render(<ReceiptForm door={door} files={212} isTaken={false} />);
    expect(screen.getByRole("button", { name: "Sign the receipt" })).toBeDisabled();
    expect(screen.getByText("Take the files and check them first.")).toBeVisible();
  });

  it("refuses with words, and not without", async () => {
    const user = userEvent.setup();
    render(<ReceiptForm door={door} files={212} isTaken />);
    await user.click(screen.getByRole("button", { name: "something is wrong" }));
    await user.click(screen.getByRole("button", { name: "Refuse the delivery" }));
    expect(screen.getByText(/Say what is wrong/)).toBeVisible();
    expect(asked).toEqual([]);
    await user.type(screen.getByLabelText(/What is wrong/), "Frame 1002 is torn.");
    await user.click(screen.getByRole("button", { name: "Refuse the delivery" }));
    await waitFor(() => expect(refresh).toHaveBeenCalled());
    expect(asked).toMatchObject([{ body: { kind: "refused", words: "Frame 1002 is torn." } }]);
  });

  it("can only be refused once the delivery is stopped", () => {
    render(<ReceiptForm door={door} files={0} isTaken onlyRefuse />);
    expect(screen.queryByRole("button", { name: "Sign the receipt" })).toBeNull();
    expect(screen.getByRole("button", { name: /something is wrong/ })).toBeVisible();
  });
});
