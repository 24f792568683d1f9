import { render, screen } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { expect, it, vi } from "vitest";
import { Button } from "@/components/button/button";
import { TextAction } from "@/components/button/text-action";

it("never sends a form unless it was made to", () => {
  render(
    <>
      <Button>Open</Button>
      <TextAction>Keep for later</TextAction>
      <Button type="submit">Sign</Button>
    </>,
  );
  expect(screen.getAllByRole("button").map((button) => button.getAttribute("type"))).toEqual([
    "button",
    "button",
    "submit",
  ]);
});

it("stands beside the sentence that says what is missing, and cannot act", async () => {
  const onClick = vi.fn();
  render(
    <Button onClick={onClick} missing="Two frames are still to be checked.">
      Sign the receipt
    </Button>,
  );
  const button = screen.getByRole("button", { name: "Sign the receipt" });
  expect(button).toBeDisabled();
  expect(button).toHaveAccessibleDescription("Two frames are still to be checked.");
  expect(screen.getByText("Two frames are still to be checked.")).toBeVisible();
  await userEvent.click(button);
  expect(onClick).not.toHaveBeenCalled();
});

it("acts once: not again while its act is under way", async () => {
  const onClick = vi.fn();
  const onSubmit = vi.fn((event: React.FormEvent) => event.preventDefault());
  const form = (busy: boolean) => (
    <form onSubmit={onSubmit}>
      <Button type="submit" busy={busy} onClick={onClick}>
        Send for review
      </Button>
    </form>
  );
  const { rerender } = render(form(false));
  await userEvent.click(screen.getByRole("button"));
  rerender(form(true));
  expect(screen.getByRole("button")).toHaveAttribute("aria-busy", "true");
  await userEvent.click(screen.getByRole("button"));
  expect(onClick).toHaveBeenCalledTimes(1);
  expect(onSubmit).toHaveBeenCalledTimes(1);
});
