import { beforeAll, describe, expect, it } from "vitest";
import { backOffSeconds } from "@/lib/mail/back-off";
import { messageIdOf, writeLetter } from "@/lib/mail/write-letter";
import { tokenOf } from "@/lib/people/token";

beforeAll(() => void (process.env.NEXTAUTH_SECRET = "0123456789abcdef0123456789abcdef"));

const link = "11111111-1111-4111-8111-111111111111";
const payload = {
  to: "odo@ringwright.example",
  subject: "Version 4 of EH-020 waits <for> you",
  paragraphs: ["Sunniva Brok sent version 4 & asks for your verdict.", "It has 96 frames."],
  action: { label: "Open version 4", path: "/versions/abc" },
};
const studio = "http://127.0.0.1:3000";

describe("a letter", () => {
  it("says the same in plain text and in HTML, with the link in full", async () => {
    const { text, html, subject, to } = await writeLetter("mail k", payload, studio);
    expect({ subject, to }).toEqual({ subject: payload.subject, to: payload.to });
    expect(text).toBe(
      "Sunniva Brok sent version 4 & asks for your verdict.\n\nIt has 96 frames.\n\n" +
        "Open version 4:\nhttp://127.0.0.1:3000/versions/abc\n\nSent by Ringwright at http://127.0.0.1:3000\n",
    );
    expect(html).toContain('href="http://127.0.0.1:3000/versions/abc"');
    expect(html).toContain("version 4 &amp; asks");
    expect(html).not.toContain("<for>");
  });

  it("is the same, Message-ID included, however often it is written", async () => {
    expect(await writeLetter("mail k", payload, studio)).toEqual(
      await writeLetter("mail k", payload, studio),
    );
    expect(messageIdOf("mail k")).toMatch(/^<[0-9a-f]{40}@ringwright\.example>$/);
    expect(messageIdOf("mail k")).not.toBe(messageIdOf("mail j"));
  });

  it("completes a single-use link with its token, which the payload does not hold", async () => {
    const secret = { ...payload, action: { label: "Join", path: "/invitation/", link } };
    const { text } = await writeLetter("mail k", secret, studio);
    expect(text).toContain(`${studio}/invitation/${tokenOf(link)}\n`);
    expect(tokenOf(link)).toMatch(/^[\w-]{43}$/);
    expect(JSON.stringify(secret)).not.toContain(tokenOf(link));
  });
});

describe("waiting after a failure", () => {
  it("doubles from five seconds to an hour and never grows beyond", () => {
    expect([1, 2, 3, 10].map(backOffSeconds)).toEqual([5, 10, 20, 2560]);
    expect([11, 50, 1e9].map(backOffSeconds)).toEqual([3600, 3600, 3600]);
  });
});
