import { beforeAll, describe, expect, it } from "vitest";
import { authOptions } from "@/lib/auth/options";

beforeAll(() => void (process.env.NEXTAUTH_SECRET = "0123456789abcdef0123456789abcdef"));

const token = { personId: "p", epoch: 3 };

describe("a session", () => {
  it("carries who and since which epoch, from sign-in on", async () => {
    const { jwt, session } = authOptions().callbacks!;
    const user = { id: "p", email: "p@ringwright.example", name: "P", epoch: 3 };
    const made = await jwt!({ token: {}, user, account: null });
    expect(made).toMatchObject(token);
    expect(await jwt!({ token: made, user: undefined as never, account: null })).toMatchObject(token);
    const given = {
      session: { expires: "" },
      token: made,
      user: { ...user, emailVerified: null },
      newSession: null,
      trigger: "update" as const,
    };
    expect(await session!(given)).toMatchObject(token);
  });

  it("cannot be made without a secret of 32 characters", () => {
    const secret = process.env.NEXTAUTH_SECRET;
    process.env.NEXTAUTH_SECRET = "short";
    expect(() => authOptions()).toThrow("NEXTAUTH_SECRET");
    process.env.NEXTAUTH_SECRET = secret;
  });
});
