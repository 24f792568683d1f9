import { readFileSync } from "node:fs";
import { expect, type Browser, type Page } from "@playwright/test";

export type Part = "owner" | "artist" | "advisor" | "producer" | "client";

interface Account {
  role: Part;
  name: string;
  email: string;
  password: string;
}

/** The demonstration's accounts, as its maker wrote them. */
export function account(part: Part): Account {
  const file = process.env.DEMO_ACCOUNTS_FILE;
  if (!file) throw new Error("DEMO_ACCOUNTS_FILE is not set: run the browser tests through npm test.");
  const accounts = JSON.parse(readFileSync(file, "utf8")) as Account[];
  return accounts.find(({ role }) => role === part)!;
}

/** A browser of this person's own, signed in by the form as they would. */
export async function enter(
  browser: Browser,
  part: Part,
  viewport = { width: 1440, height: 900 },
): Promise<Page> {
  const { email, password } = account(part);
  const context = await browser.newContext({ viewport, reducedMotion: "reduce", acceptDownloads: true });
  const page = await context.newPage();
  await page.goto("/sign-in");
  await page.getByLabel("E-mail").fill(email);
  await page.getByLabel("Password").fill(password);
  await page.getByRole("button", { name: "Sign in" }).click();
  await expect(page).not.toHaveURL(/sign-in/);
  return page;
}

/** Asks the API as this page's person; the answer's status and body. */
export async function ask(page: Page, method: string, path: string, body?: unknown) {
  const data = typeof body === "string" ? body : body === undefined ? undefined : JSON.stringify(body);
  const headers = { "content-type": "application/json" };
  const response = await page.request.fetch(path, {
    method,
    headers,
    ...(data === undefined ? {} : { data }),
  });
  const text = await response.text();
  return {
    status: response.status(),
    body: text.startsWith("{") || text.startsWith("[") ? JSON.parse(text) : text,
  };
}
