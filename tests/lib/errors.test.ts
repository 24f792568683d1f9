import { describe, expect, it } from "vitest";
import { z } from "zod";
import { DomainError, found, parseInput, statusOf } from "@/lib/errors";

const shape = z.object({ shot: z.object({ spin: z.number().max(0.9999, "Must be at most 0.9999.") }) });

describe("errors", () => {
  it("names the field and says why when input is refused", () => {
    const refusal = () => parseInput(shape, { shot: { spin: 1 } });
    expect(refusal).toThrow("shot.spin: Must be at most 0.9999.");
    try {
      refusal();
    } catch (error) {
      expect(error).toMatchObject({ code: "invalid", field: "shot.spin" });
    }
  });

  it("hands back what was parsed", () => {
    expect(parseInput(shape, { shot: { spin: 0.9 } })).toEqual({ shot: { spin: 0.9 } });
  });

  it("answers each kind of refusal with its own HTTP status", () => {
    const status = (code: DomainError["code"]) => statusOf(new DomainError(code, "why"));
    expect(status("invalid")).toBe(400);
    expect(status("forbidden")).toBe(403);
    expect(status("not-found")).toBe(404);
    expect(status("conflict")).toBe(409);
    expect(status("gone")).toBe(410);
    expect(status("too-many")).toBe(429);
  });

  it("says that there is no such thing without saying whether it exists elsewhere", () => {
    expect(() => found(undefined, "shot")).toThrow("There is no such shot, or it is not yours to see.");
    expect(found(0, "shot")).toBe(0);
  });
});
