import { NextRequest } from "next/server";
import { describe, expect, it } from "vitest";
import { proxy } from "@/proxy";

const visit = (
  url = "http://127.0.0.1:3000/studio/log?production=studio",
  headers: Record<string, string> = {},
) => proxy(new NextRequest(url, { headers })).headers;
/** A header of the request as the page behind the proxy sees it. */
const passedOn = (headers: Headers, name: string) => headers.get(`x-middleware-request-${name}`);

describe("the proxy", () => {
  it("allows scripts by a nonce of this answer alone, and tells the page which", () => {
    const [one, other] = [visit(), visit()];
    const nonce = passedOn(one, "x-nonce");
    expect(nonce).toMatch(/^[A-Za-z0-9+/]{22}==$/);
    expect(passedOn(other, "x-nonce")).not.toBe(nonce);
    expect(one.get("content-security-policy")).toContain(`'nonce-${nonce}'`);
    expect(passedOn(one, "content-security-policy")).toBe(one.get("content-security-policy"));
  });

  it("allows nothing from elsewhere, no frame around us, and no evaluation but of wasm", () => {
    const rules = Object.fromEntries(
      visit()
        .get("content-security-policy")!
        .split("; ")
        .map((rule) => [rule.split(" ")[0]!, rule.split(" ").slice(1).join(" ")]),
    );
    expect(rules).toMatchObject({
      "default-src": "'self'",
      "connect-src": "'self'",
      "worker-src": "'self' blob:",
      "img-src": "'self' blob: data:",
      "frame-ancestors": "'none'",
      "base-uri": "'none'",
      "form-action": "'self'",
      "object-src": "'none'",
    });
    expect(rules["script-src"]).toMatch(/^'self' 'nonce-[^']+' 'strict-dynamic' 'wasm-unsafe-eval'$/);
  });

  it("sends the other headers that keep sites apart", () => {
    const headers = visit();
    expect(headers.get("x-content-type-options")).toBe("nosniff");
    expect(headers.get("referrer-policy")).toBe("same-origin");
    expect(headers.get("cross-origin-opener-policy")).toBe("same-origin");
    expect(headers.get("cross-origin-resource-policy")).toBe("same-origin");
    expect(headers.get("permissions-policy")).toContain("camera=()");
  });

  it("asks for HTTPS for good only where it is HTTPS already", () => {
    expect(visit().get("strict-transport-security")).toBeNull();
    expect(visit("https://studio.ringwright.example/").get("strict-transport-security")).toMatch(
      /^max-age=\d+/,
    );
    const behindProxy = visit(undefined, { "x-forwarded-proto": "https" });
    expect(behindProxy.get("strict-transport-security")).toMatch(/^max-age=\d+/);
  });

  it("tells the page where it is, so that sign-in leads back", () => {
    expect(passedOn(visit(), "x-path")).toBe("/studio/log?production=studio");
    expect(passedOn(visit(undefined, { "x-path": "/elsewhere" }), "x-path")).toBe(
      "/studio/log?production=studio",
    );
  });

  it("keeps a plain request id and replaces one that could forge lines of the log", () => {
    const idOf = (given: string) => passedOn(visit(undefined, { "x-request-id": given }), "x-request-id");
    expect(idOf("edge-0123456789")).toBe("edge-0123456789");
    for (const strange of ['{"level":50}', "short", "a".repeat(65), "with space 1234"])
      expect(idOf(strange)).toMatch(/^[0-9a-f-]{36}$/);
  });
});
