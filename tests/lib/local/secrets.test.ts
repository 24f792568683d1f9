import { mkdtempSync, readdirSync, statSync } from "node:fs";
import { tmpdir } from "node:os";
import { dirname, join } from "node:path";
import { expect, it } from "vitest";
import { formatAccounts } from "@/lib/local/demonstration.mjs";
import { ensureSecrets } from "@/lib/local/secrets.mjs";

it("secrets are made once, differ from each other, and only their owner can read them", () => {
  const file = join(mkdtempSync(join(tmpdir(), "ringwright-secrets-")), "data", "secrets.json");
  const made = ensureSecrets(file);
  expect(new Set(Object.values(made)).size).toBe(3);
  expect(Math.min(...Object.values(made).map((secret) => secret.length))).toBeGreaterThanOrEqual(32);
  expect(ensureSecrets(file)).toEqual(made);
  expect(statSync(file).mode & 0o777).toBe(0o600);
  expect(readdirSync(dirname(file))).toEqual(["secrets.json"]);
});

it("the accounts are printed in columns", () => {
  const accounts = [
    { role: "owner", name: "Ada Long-Name", email: "ada@studio.example", password: "one" },
    { role: "client", name: "Bo", email: "bo@client.example", password: "two" },
  ];
  expect(formatAccounts(accounts)).toEqual([
    "  owner   Ada Long-Name  ada@studio.example  one",
    "  client  Bo             bo@client.example   two",
  ]);
});
