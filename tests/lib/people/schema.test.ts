import { describe, expect, it } from "vitest";
import { emailSchema, inviteInput, joinAsNewInput, passwordSchema } from "@/lib/people/schema";
import { createProductionInput } from "@/lib/productions/schema";

const faultOf = (result: {
  success: boolean;
  error?: { issues: { message: string; path: PropertyKey[] }[] };
}) =>
  result.error?.issues.map(({ path, message }) => [path.join("."), message].filter(Boolean).join(": ")) ?? [];

describe("what forms about people ask for", () => {
  it("writes an e-mail address in lower case, as the database keeps it", () => {
    expect(emailSchema.parse("  Runa.Halvard@Ringwright.example ")).toBe("runa.halvard@ringwright.example");
  });

  it.each(["", "runa", "runa@", "a@b@c.example", `${"a".repeat(250)}@ringwright.example`])(
    "refuses the address %j in words",
    (email) => expect(faultOf(emailSchema.safeParse(email)).join()).toMatch(/e-mail address/),
  );

  it("takes a password of 12 characters and refuses one of 11", () => {
    expect(passwordSchema.safeParse("x".repeat(12)).success).toBe(true);
    expect(faultOf(passwordSchema.safeParse("x".repeat(11)))).toEqual([
      "A password has at least 12 characters. Four unrelated words do well.",
    ]);
    expect(passwordSchema.safeParse("x".repeat(201)).success).toBe(false);
  });

  it("names every field at fault", () => {
    const faults = faultOf(
      joinAsNewInput.safeParse({ token: "t", name: " ", password: "short", timeZone: "Mars/Olympus" }),
    );
    expect(faults.map((fault) => fault.split(":")[0])).toEqual(["name", "password", "timeZone"]);
  });

  it("knows no role but the four", () => {
    const invitation = {
      productionId: "11111111-1111-4111-8111-111111111111",
      email: "a@ringwright.example",
      name: "A",
      role: "owner",
    };
    expect(faultOf(inviteInput.safeParse(invitation))[0]).toMatch(/^role: Choose a role/);
  });
});

describe("a production's code", () => {
  it("is a letter and one to seven more letters or figures, in capitals", () => {
    const parse = (code: string) =>
      createProductionInput.safeParse({ code, name: "Ember Harbour", kind: "film" });
    expect(parse(" eh2 ").data?.code).toBe("EH2");
    for (const code of ["E", "2H", "E-H", "ABCDEFGHI", ""])
      expect(faultOf(parse(code))[0]).toMatch(/^code: /);
  });
});
