import { mkdtempSync, readFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { expect, test, type Page } from "@playwright/test";
import { account, enter } from "./support/people";
import { setUpShot } from "./support/set-up-shot";
import { filesIn, run, unpack } from "./support/unpack";

const code = "SM-700";
const title = `${code}, to try the way`;

/** One shot, from nothing to a signed receipt: four people, each in a browser of their own. */
test("a shot is set up, rendered, judged, delivered, taken, checked and received", async ({ browser }) => {
  test.setTimeout(300_000);
  const [producer, artist] = [await enter(browser, "producer"), await enter(browser, "artist")];
  await addShot(producer);
  await renderVersion(artist);
  await sendForReview(artist);
  const figures = await judge(await enter(browser, "advisor"));
  await deliver(producer, figures);
  const client = await enter(browser, "client");
  const archive = await take(client);
  checkArchive(archive, figures);
  await receive(client, archive);

  await producer.goto("/shots");
  await expect(producer.getByRole("row", { name: code })).toContainText("received");
});

async function addShot(page: Page): Promise<void> {
  await page.goto("/shots");
  await page.getByRole("button", { name: "New shot" }).click();
  await page.getByLabel("Code").fill(code);
  await page.getByLabel("Brief").fill("Carried from setup to receipt.");
  await page.getByLabel("Artist").selectOption({ label: account("artist").name });
  await page.getByRole("button", { name: "Add the shot" }).click();
  await expect(page.getByRole("row", { name: code })).toContainText("open");
}

async function renderVersion(page: Page): Promise<void> {
  await setUpShot(page, code, { width: 160, height: 90, frames: 2 });
  await page.getByRole("button", { name: "Render a version" }).click();
  await expect(page).toHaveURL(/\/versions\//);
  // The page follows the render by itself.
  await expect(page.getByText("ready", { exact: true }).first()).toBeVisible({ timeout: 90_000 });
}

async function sendForReview(page: Page): Promise<void> {
  await page.getByRole("button", { name: "Send for review" }).click();
  await page.getByLabel("What should the advisor look at?").fill("Is the second image where it should be?");
  await page.getByRole("button", { name: "Send it for review" }).click();
  await expect(page.getByText("in review", { exact: true }).first()).toBeVisible();
}

/** The advisor comes by Today, reads the digest off the page and signs with its last eight figures. */
async function judge(page: Page): Promise<string> {
  await page.goto("/today");
  await expect(page.getByRole("heading", { level: 1 })).toContainText("wait");
  await page.goto("/review");
  const row = page.getByRole("listitem").filter({ hasText: code });
  await row.getByRole("link", { name: "Give the verdict" }).click();
  await expect(page.getByRole("heading", { name: "Verdict on frames" })).toBeVisible();
  const digest = (await page.locator("main").innerText()).match(/(?:[0-9a-f]{8}\s+){7}[0-9a-f]{8}/);
  const figures = digest![0].slice(-8);
  await page.getByText("signed off.").click();
  await page
    .getByLabel("In these words")
    .fill("The bending and the order of the images are as physics has them.");
  await page.getByLabel("To sign").fill("00000000");
  await page.getByRole("button", { name: "Declare it signed off" }).click();
  await expect(page.getByText(/last eight figures/).last()).toBeVisible();
  await page.getByLabel("To sign").fill(figures);
  await page.getByRole("button", { name: "Declare it signed off" }).click();
  await expect(page.getByText("Your declaration is given, and stands in the log.")).toBeVisible();
  return figures;
}

async function deliver(page: Page, figures: string): Promise<void> {
  await page.goto("/deliveries");
  await page.getByRole("link", { name: "Assemble a delivery of The Salt Meridian" }).click();
  await expect(page.getByRole("row", { name: code })).toContainText(figures);
  await page.getByLabel(code).check();
  await page.getByLabel("Title").fill(title);
  await page.getByRole("button", { name: "Assemble it" }).click();
  await expect(page.getByLabel(account("client").name)).toBeChecked();
  await page.getByRole("button", { name: "Publish it" }).click();
  await expect(page.getByText("delivered", { exact: true }).first()).toBeVisible();
}

async function take(page: Page): Promise<string> {
  await page.goto("/deliveries");
  await page.getByRole("link", { name: title }).click();
  await expect(page.getByRole("button", { name: "Sign the receipt" })).toBeDisabled();
  const download = page.waitForEvent("download");
  await page.getByRole("link", { name: /^Take all/ }).click();
  const taken = await download;
  expect(taken.suggestedFilename()).toMatch(/^SM-.*\.zip$/);
  const archive = join(mkdtempSync(join(tmpdir(), "ringwright-taken-")), taken.suggestedFilename());
  await taken.saveAs(archive);
  return archive;
}

/** With programs that are not ours: unzip, sha256sum, and Debian's OpenEXR tools. */
function checkArchive(archive: string, figures: string): void {
  const folder = unpack(archive);
  const files = filesIn(folder);
  const exrs = files.filter((file) => file.endsWith(".exr"));
  expect([exrs.length, files.filter((file) => file.endsWith(".png")).length]).toEqual([2, 2]);
  expect(run("sha256sum", ["--check", "manifest-sha256.txt"], folder).match(/: OK$/gm)).toHaveLength(
    files.length - 1,
  );
  const header = run("exrheader", [exrs[0]!], folder);
  expect(header).toMatch(/chromaticities/);
  expect(header).toMatch(/framesPerSecond.*24/);
  expect(header).toMatch(/R, 16-bit floating-point/);
  const note = readFileSync(join(folder, "science/science-note.txt"), "utf8");
  expect(note).toContain(account("advisor").name);
  expect(note).toContain(figures);
  expect(note).toMatch(/qualified test/);
  const setup = JSON.parse(
    readFileSync(
      join(
        folder,
        files.find((file) => file.endsWith("setup.json"))!,
      ),
      "utf8",
    ),
  );
  expect([setup.picture.width, setup.picture.height]).toEqual([160, 90]);
}

async function receive(page: Page, archive: string): Promise<void> {
  await expect(page.getByText("You have taken everything.")).toBeVisible({ timeout: 10_000 });
  // A file chosen before the page's script is there is not seen: choose again, as a person would.
  await expect(async () => {
    await page.getByLabel(/Choose the archive|Check another archive/).setInputFiles(archive);
    await expect(page.getByText(/^All \d+ files match what was signed\./)).toBeVisible({ timeout: 4000 });
  }).toPass({ timeout: 30_000 });
  await page.getByRole("button", { name: "Sign the receipt" }).click();
  await expect(page.getByRole("heading", { level: 1 })).toContainText("signed off and received");
}
