import { expect, type Page } from "@playwright/test";

interface Wanted {
  width: number;
  height: number;
  frames: number;
}

/** Opens a shot's setup as an artist would, makes the frames small and few, and waits until that is saved. */
export async function setUpShot(page: Page, code: string, { width, height, frames }: Wanted): Promise<void> {
  await page.goto("/shots");
  await page.getByRole("link", { name: code }).first().click();
  await expect(page).toHaveURL(/\/bench$/);
  const first = Number(await page.getByLabel("first frame").inputValue());
  for (const [label, value] of [
    ["width", width],
    ["height", height],
    ["last frame", first + frames - 1],
  ] as const) {
    const saved = page.waitForResponse((answer) => answer.request().method() === "PUT" && answer.ok());
    await page.getByLabel(label, { exact: true }).fill(String(value));
    await saved;
  }
  await expect(page.getByText(`frames ${first}–${first + frames - 1}`)).toBeVisible();
}
