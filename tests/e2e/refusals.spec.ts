import { expect, test, type Page } from "@playwright/test";
import { ask, enter } from "./support/people";
import { beforeSignIn, fill, listRoutes } from "./support/routes";

const routes = listRoutes();
const changes = routes.filter(({ method }) => method !== "GET");
const asked = ({ method, path }: { method: string; path: string }) => `${method} ${path}`;

interface Facts {
  production: string;
  shot: string;
  version: string;
}

async function factsOf(page: Page, code: string): Promise<Facts> {
  for (const { id: production } of (await ask(page, "GET", "/api/shots")).body.productions) {
    const list = (await ask(page, "GET", `/api/shots?production=${production}`)).body;
    for (const { shots } of list.groups)
      for (const shot of shots)
        if (shot.code === code) return { production, shot: shot.id, version: shot.version.id };
  }
  throw new Error(`The demonstration has no ${code}.`);
}

test("the API has handlers to refuse with", () => {
  expect(changes.length).toBeGreaterThan(15);
});

test("JSON that is malformed is refused by every route, naming the body", async ({ browser }) => {
  const page = await enter(browser, "producer");
  for (const route of changes) {
    const { status, body } = await ask(page, route.method, fill(route.path), '{"spin": 0.9');
    expect([asked(route), status, body.error?.field]).toEqual([asked(route), 400, "body"]);
  }
});

test("nobody who is not signed in is answered, but for what comes before signing in", async ({ page }) => {
  for (const route of routes.filter((one) => !beforeSignIn(one))) {
    const { status } = await ask(
      page,
      route.method,
      fill(route.path),
      route.method === "GET" ? undefined : {},
    );
    expect([asked(route), status]).toEqual([asked(route), 401]);
  }
});

test("a change asked for by another site's page is refused", async ({ browser }) => {
  const page = await enter(browser, "owner");
  const headers = { origin: "https://elsewhere.example", "content-type": "application/json" };
  for (const { method, path } of changes) {
    const response = await page.request.fetch(fill(path), { method, headers, data: "{}" });
    expect([asked({ method, path }), response.status()]).toEqual([asked({ method, path }), 403]);
  }
});

test("a client asks every route about a shot in review and learns nothing of it", async ({ browser }) => {
  const facts = await factsOf(await enter(browser, "advisor"), "SM-020");
  const client = await enter(browser, "client");
  for (const { method, path } of routes.filter((one) => !beforeSignIn(one) && one.path !== "/api/changes")) {
    const query = path === "/api/shots" || path === "/api/log" ? `?production=${facts.production}` : "";
    const { status, body } = await ask(
      client,
      method,
      fill(path, { ...facts }) + query,
      method === "GET" ? undefined : {},
    );
    expect([asked({ method, path }), [400, 403, 404].includes(status)]).toEqual([
      asked({ method, path }),
      true,
    ]);
    expect(JSON.stringify(body)).not.toMatch(/SM-0(20|30|40|60|70|80)/);
  }
});

test("the wrong role is told so, and another production's thing is not there", async ({ browser }) => {
  const artist = await enter(browser, "artist");
  const facts = await factsOf(artist, "SM-070");
  const owner = await enter(browser, "owner");
  const code = `X${Date.now().toString(36).slice(-6).toUpperCase()}`;
  const made = await ask(owner, "POST", "/api/productions", { code, name: "Nobody's yet", kind: "film" });
  expect(made.status).toBe(200);
  const sequence = { name: "First" };

  expect(
    (await ask(artist, "POST", "/api/sequences", { ...sequence, production: facts.production })).status,
  ).toBe(403);
  expect(
    (await ask(artist, "POST", "/api/sequences", { ...sequence, production: made.body.id })).status,
  ).toBe(404);
  expect((await ask(artist, "GET", `/api/shots?production=${made.body.id}`)).status).toBe(404);
  const verdict = {
    kind: "signed off",
    first: 1001,
    last: 1002,
    words: "",
    figures: "00000000",
    after: null,
  };
  const own = await ask(artist, "POST", `/api/versions/${facts.version}/verdicts`, verdict);
  expect([own.status, own.body.error.message]).toEqual([403, expect.stringContaining("science advisor")]);
});

test("a page of what is not there, and one of what is not the reader's, are the same page and a 404", async ({
  browser,
}) => {
  const facts = await factsOf(await enter(browser, "advisor"), "SM-020");
  const client = await enter(browser, "client");
  const nothing = "00000000-0000-4000-8000-000000000000";
  for (const path of ["/versions/{}", "/versions/{}/verdict", "/shots/{}/bench", "/deliveries/{}"]) {
    const words = [];
    for (const id of [path.startsWith("/shots") ? facts.shot : facts.version, nothing]) {
      const response = await client.goto(path.replace("{}", id));
      expect([path, response!.status()]).toEqual([path, 404]);
      words.push(await client.locator("main").innerText());
    }
    expect(words[0]).toBe(words[1]);
    await expect(client.getByRole("main")).toHaveCount(1);
  }
});

test("every page and answer carries the security headers, and scripts run by nonce", async ({ page }) => {
  const response = await page.goto("/sign-in");
  const headers = response!.headers();
  expect(headers["content-security-policy"]).toMatch(/script-src 'self' 'nonce-[^']+' 'strict-dynamic'/);
  expect(headers["content-security-policy"]).not.toContain("'unsafe-eval'");
  expect(headers["x-content-type-options"]).toBe("nosniff");
  expect(headers["referrer-policy"]).toBe("same-origin");
  expect((await page.request.get("/api/health")).headers()["content-security-policy"]).toContain(
    "frame-ancestors 'none'",
  );
});
