import { describe, expect, it } from "vitest";
import { hashPassword, verifyPassword } from "@/lib/auth/password";

describe("a password", () => {
  it("is kept as a salted Argon2id hash at OWASP's minimum cost or above (from memory: 19 MiB, 2 passes)", async () => {
    const [one, other] = await Promise.all([
      hashPassword("four unrelated words"),
      hashPassword("four unrelated words"),
    ]);
    expect(one).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/);
    expect(one).not.toBe(other);
  });

  it("is known again, and another is not", async () => {
    const hash = await hashPassword("four unrelated words");
    expect(await verifyPassword(hash, "four unrelated words")).toBe(true);
    expect(await verifyPassword(hash, "four unrelated Words")).toBe(false);
  });

  it("is never right where there is no account", async () => {
    expect(await verifyPassword(undefined, "anything at all")).toBe(false);
  });
});
