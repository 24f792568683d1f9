import { expect, it } from "vitest";
import { checkNode } from "@/lib/local/check-node.mjs";
import { parseStartOptions, parseTestOptions } from "@/lib/local/options.mjs";

it("without a wish the port is left open and the data are in .data", () => {
  expect(parseStartOptions([])).toEqual({ port: null, freshDemo: false, data: ".data" });
});

it("wishes are taken as given", () => {
  const args = ["--port", "4000", "--fresh-demo", "--data", "/elsewhere"];
  expect(parseStartOptions(args)).toEqual({ port: 4000, freshDemo: true, data: "/elsewhere" });
});

it.each(["0", "65536", "80.5", "http", "-1"])("port %s is refused with the range it must be in", (port) => {
  expect(() => parseStartOptions([`--port=${port}`])).toThrow(/whole number from 1 to 65535/);
});

it("an unknown flag is refused with what there is", () => {
  expect(() => parseStartOptions(["--fresh"])).toThrow(/--fresh-demo/);
  expect(() => parseTestOptions(["--only", "everything"])).toThrow(/unit, db or e2e/);
});

it.each(["18.19.0", "20.10.9"])("Node %s is refused with what to do", (version) => {
  expect(() => checkNode(version)).toThrow(/Install Node 20/);
});

it.each(["20.11.0", "20.20.2", "22.0.0"])("Node %s will do", (version) => {
  expect(() => checkNode(version)).not.toThrow();
});
