import { describe, expect, it } from "vitest";
import { localPath } from "@/lib/auth/local-path";

describe("the path after sign-in", () => {
  it.each(["/studio", "/shots?production=a&sort=due", "/versions/1#files"])("keeps %s", (path) => {
    expect(localPath(path)).toBe(path);
  });

  it.each([
    "https://elsewhere.example/",
    "//elsewhere.example",
    "/\\elsewhere.example",
    "/\t/elsewhere.example",
    "\\\\elsewhere.example",
    "javascript:alert(1)",
    "studio",
    "",
    undefined,
    ["/studio"],
    "/sign-in?next=/sign-in",
  ])("leads %j to the start instead", (wanted) => {
    expect(localPath(wanted)).toBe("/");
  });
});
