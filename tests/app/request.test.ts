import { describe, expect, it } from "vitest";
import { checkOrigin, errorResponse, readInput } from "@/app/request";
import { DomainError } from "@/lib/errors";

const post = (body: string, headers: Record<string, string> = {}) =>
  new Request("http://127.0.0.1:3000/api/shots?production=p1", { method: "POST", body, headers });

describe("reading a request", () => {
  it("joins query, body and path, and lets the path win", async () => {
    const input = await readInput(post('{"code":"SM-010","shot":"from the body"}'), {
      shot: "from the path",
    });
    expect(input).toEqual({ production: "p1", code: "SM-010", shot: "from the path" });
  });

  it("refuses a body that is not JSON, and names the body", async () => {
    await expect(readInput(post("{spin: 1"), {})).rejects.toMatchObject({ code: "invalid", field: "body" });
  });

  it.each(["[]", "3", "null", '"x"'])("refuses %s, which is JSON but not an object", async (text) => {
    await expect(readInput(post(text), {})).rejects.toMatchObject({ code: "invalid", field: "body" });
  });

  it("refuses a body over a megabyte", async () => {
    await expect(readInput(post(`{"x":"${"a".repeat(1_000_001)}"}`), {})).rejects.toMatchObject({
      code: "too-large",
    });
  });

  it("refuses a change asked for by another site's page", () => {
    const from = (origin: string) => () => checkOrigin(post("{}", { origin, host: "127.0.0.1:3000" }));
    expect(from("https://elsewhere.example")).toThrow("another site");
    expect(from("null")).toThrow("another site");
    expect(from("http://127.0.0.1:3000")).not.toThrow();
  });

  it("keeps a fault's own text out of the answer and gives its id instead", async () => {
    const response = errorResponse(new Error("password=secret in the connection string"), "request-7");
    expect(response.status).toBe(500);
    const text = await response.text();
    expect(text).toContain("request-7");
    expect(text).not.toContain("secret");
  });

  it("answers a refusal with its words and field", async () => {
    const response = errorResponse(new DomainError("invalid", "spin: too large", "spin"), "r");
    expect(response.status).toBe(400);
    expect(await response.json()).toEqual({
      error: { code: "invalid", message: "spin: too large", field: "spin" },
    });
  });
});
