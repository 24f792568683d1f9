import { expect, it } from "vitest";
import { isInstalled } from "@/lib/local/npm-packages.mjs";

const wanted = {
  "": { version: "0.1.0" },
  "node_modules/one": { version: "1.0.0" },
  "node_modules/one-for-another-system": { version: "1.0.0", optional: true },
};

it("an installation that was interrupted, or never made, is made", () => {
  expect(isInstalled(wanted, null)).toBe(false);
});

it("packages for another system need not be there", () => {
  expect(isInstalled(wanted, { "node_modules/one": { version: "1.0.0" } })).toBe(true);
});

it("a package missing or of another version asks for an installation", () => {
  expect(isInstalled(wanted, {})).toBe(false);
  expect(isInstalled(wanted, { "node_modules/one": { version: "1.0.1" } })).toBe(false);
});
