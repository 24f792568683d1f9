import { readFileSync } from "node:fs";
import { expect, test, type Page } from "@playwright/test";
import { ask, enter } from "./support/people";
import { setUpShot } from "./support/set-up-shot";

const workerPid = (): number => {
  const pids = JSON.parse(readFileSync(process.env.E2E_PIDS_FILE!, "utf8"));
  return pids.processes.worker.pid;
};

/** The render's state and how many of its frames are whole. */
async function readRender(page: Page): Promise<{ state: string; whole: number }> {
  const { body } = await ask(page, "GET", `/api/versions/${page.url().split("/").pop()}`);
  const runs = body.finished as { first: number; last: number }[];
  return {
    state: body.render.state,
    whole: runs.reduce((sum, { first, last }) => sum + last - first + 1, 0),
  };
}

test("a version whose worker is killed in mid-render finishes whole by itself", async ({ browser }) => {
  test.setTimeout(300_000);
  const page = await enter(browser, "artist");
  await setUpShot(page, "SM-080", { width: 320, height: 180, frames: 12 });
  await page.getByRole("button", { name: "Render a version" }).click();
  await expect(page).toHaveURL(/\/versions\//);

  await expect.poll(async () => (await readRender(page)).whole, { timeout: 90_000 }).toBeGreaterThan(1);
  const killed = workerPid();
  expect((await readRender(page)).whole).toBeLessThan(12);
  process.kill(killed, "SIGKILL");

  await expect(page.getByText("ready", { exact: true }).first()).toBeVisible({ timeout: 150_000 });
  expect(workerPid()).not.toBe(killed);
  expect(await readRender(page)).toEqual({ state: "complete", whole: 12 });
});
