import AxeBuilder from "@axe-core/playwright";
import { expect, test, type Page } from "@playwright/test";
import { ask, enter, type Part } from "./support/people";

const sizes = [
  { width: 1440, height: 900 },
  { width: 1024, height: 768 },
  { width: 390, height: 844 },
];

/** What each person has open in a day's work; {…} is filled from the demonstration. */
const screens: [Part, string[]][] = [
  ["artist", ["/today", "/shots", "/shots/{shot SM-080}/bench", "/versions/{SM-070}", "/review"]],
  ["advisor", ["/today", "/review", "/versions/{SM-020}", "/versions/{SM-020}/verdict"]],
  [
    "producer",
    [
      "/today",
      "/shots",
      "/versions/{SM-110}",
      "/deliveries",
      "/deliveries/new?production={production}",
      "/studio",
    ],
  ],
  ["client", ["/deliveries", "/deliveries/{delivery}"]],
  ["owner", ["/studio", "/studio/log", "/studio/mail", "/shots"]],
];

async function readPlaces(page: Page): Promise<Record<string, string>> {
  const { production, groups } = (await ask(page, "GET", "/api/shots")).body;
  const places: Record<string, string> = { production: production.id };
  for (const { shots } of groups)
    for (const { code, id, version } of shots) {
      places[`shot ${code}`] = id;
      if (version) places[code] = version.id;
    }
  await page.goto("/deliveries");
  const href = await page
    .getByRole("link", { name: /SM-050/ })
    .first()
    .getAttribute("href");
  return { ...places, delivery: href!.split("/").pop()! };
}

let places: Record<string, string>;

test.beforeAll(async ({ browser }) => {
  places = await readPlaces(await enter(browser, "producer"));
});

const pathOf = (pattern: string) => pattern.replace(/\{([^}]+)\}/g, (_, key: string) => places[key] ?? key);

for (const [part, patterns] of screens)
  for (const pattern of patterns)
    test(`${part} finds ${pattern} accessible in both rooms, whole at every size, and light`, async ({
      browser,
    }) => {
      const page = await enter(browser, part);
      const faults: string[] = [];
      page.on("pageerror", (error) => faults.push(error.message));
      page.on("console", (message) => message.type() === "error" && faults.push(message.text()));
      const weight = await weighScripts(page, () => page.goto(pathOf(pattern)));
      expect(weight).toBeLessThan(300_000);
      expect(weight).toBeGreaterThan(0);
      for (const size of sizes) {
        await page.setViewportSize(size);
        // Rulers take the new width with the next frame.
        await expect.poll(() => beyondTheEdge(page), { message: `sideways at ${size.width}` }).toBe(0);
        expect(await violations(page)).toEqual([]);
      }
      const room = await page.locator("[data-room]").first().getAttribute("data-room");
      const other = room === "desk" ? "viewing" : "desk";
      await page.getByRole("button", { name: /^Read/ }).click();
      await expect(page.locator(`[data-room="${other}"]`).first()).toBeVisible();
      await expect(page).toHaveTitle(/Ringwright/);
      expect(await violations(page)).toEqual([]);
      expect(faults).toEqual([]);
    });

test("sign-in, reset and an address that is nothing are accessible too", async ({ page }) => {
  for (const path of ["/sign-in", "/reset", "/reset/not-a-link", "/invitation/not-a-link"]) {
    await page.goto(path);
    await expect(page.getByRole("heading", { level: 1 })).toBeVisible();
    expect([path, await violations(page)]).toEqual([path, []]);
  }
});

test("no page asks any other host for anything", async ({ browser }) => {
  const page = await enter(browser, "artist");
  const hosts = new Set<string>();
  page.on("request", (request) => hosts.add(new URL(request.url()).host));
  for (const path of ["/today", "/shots", pathOf("/versions/{SM-070}"), pathOf("/shots/{shot SM-080}/bench")])
    await page.goto(path);
  expect([...hosts]).toEqual([new URL(page.url()).host]);
});

const beyondTheEdge = (page: Page): Promise<number> =>
  page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth);

async function violations(page: Page): Promise<string[]> {
  const { violations: found } = await new AxeBuilder({ page }).analyze();
  return found.map(({ id, nodes }) => `${id}: ${nodes.map(({ html }) => html.slice(0, 160)).join(" | ")}`);
}

/** Bytes of script the page itself loads, as they travel (the server compresses them). */
async function weighScripts(page: Page, open: () => Promise<unknown>): Promise<number> {
  const session = await page.context().newCDPSession(page);
  await session.send("Network.enable");
  const scripts = new Set<string>();
  let bytes = 0;
  session.on(
    "Network.responseReceived",
    ({ type, requestId }) => type === "Script" && scripts.add(requestId),
  );
  session.on("Network.loadingFinished", ({ requestId, encodedDataLength }) => {
    if (scripts.has(requestId)) bytes += encodedDataLength;
  });
  await session.send("Network.setCacheDisabled", { cacheDisabled: true });
  await open();
  await page.waitForLoadState("load");
  await page.waitForTimeout(500);
  await session.detach();
  return bytes;
}
