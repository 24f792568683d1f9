import { render, screen, waitForElementToBeRemoved } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { expect, it } from "vitest";
import { Button } from "@/components/button/button";
import { Dialog, DialogClose } from "@/components/dialog/dialog";

it("opens from its trigger, is named by its sentence, holds the keyboard, and closes with Escape", async () => {
  render(
    <Dialog
      trigger={<Button>Withdraw</Button>}
      title="Withdraw this delivery?"
      description="Its downloads stop at once."
    >
      <DialogClose>
        <Button>Keep it</Button>
      </DialogClose>
    </Dialog>,
  );
  const user = userEvent.setup();
  await user.click(screen.getByRole("button", { name: "Withdraw" }));
  const dialog = await screen.findByRole("dialog", { name: "Withdraw this delivery?" });
  expect(dialog).toHaveAccessibleDescription("Its downloads stop at once.");
  expect(dialog).toContainElement(document.activeElement as HTMLElement);
  await user.keyboard("{Escape}");
  if (screen.queryByRole("dialog")) await waitForElementToBeRemoved(() => screen.queryByRole("dialog"));
  expect(screen.getByRole("button", { name: "Withdraw" })).toHaveFocus();
});
