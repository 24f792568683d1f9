import { render, screen } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import { DeclarationForm } from "@/components/verdict/declaration-form";
import type { DeclarationFacts } from "@/lib/reviews/schema-pages";

const version = "0a4efeea-6bb6-41dd-b5af-593c30b66c93";
const facts = {
  ...{ id: version, number: 4, production: "Lodestar Harbour", shotCode: "LH-020", maker: "Tavi Orsolane" },
  ...{
    first: 1001,
    last: 1096,
    digest: `${"0".repeat(56)}e09b5a71`,
    after: null,
    told: ["Perrin Asquelle", "Tavi Orsolane"],
  },
  reader: { name: "Imke Varandel", timeZone: "UTC" },
} as unknown as DeclarationFacts;

let answer: Response;
const asked: { path: string; body: unknown }[] = [];
beforeEach(() => {
  vi.stubGlobal("fetch", async (path: string, init: RequestInit) => {
    asked.push({ path, body: JSON.parse(String(init.body)) });
    return answer;
  });
});
afterEach(() => {
  asked.length = 0;
  vi.unstubAllGlobals();
});

describe("the declaration", () => {
  it("cannot be given before a choice is made, and says so", () => {
    render(<DeclarationForm facts={facts} />);
    expect(screen.getByRole("button", { name: "Declare it signed off" })).toBeDisabled();
    expect(screen.getByText("Choose signed off or returned first.")).toBeVisible();
    expect(screen.getByText(/Perrin Asquelle and Tavi Orsolane will be told/)).toBeVisible();
  });

  it("is sent with the frames, the choice, the words and the figures, and shown as it was kept", async () => {
    const user = userEvent.setup();
    answer = Response.json({
      statement: "I, Imke Varandel, have looked.\n\nOn these frames I declare: signed off.",
    });
    render(<DeclarationForm facts={facts} />);
    await user.click(screen.getByRole("radio", { name: /signed off/ }));
    await user.clear(screen.getByLabelText("Last frame"));
    await user.type(screen.getByLabelText("Last frame"), "1048");
    await user.type(screen.getByLabelText(/In these words/), "As physics has it.");
    await user.type(screen.getByLabelText(/To sign/), "E09B5A71");
    expect(screen.getByText("They are the digest’s.")).toBeVisible();
    await user.click(screen.getByRole("button", { name: "Declare it signed off" }));
    expect(await screen.findByText("Your declaration is given, and stands in the log.")).toHaveFocus();
    expect(screen.getByText("I, Imke Varandel, have looked.")).toBeVisible();
    expect(asked).toEqual([
      {
        path: `/api/versions/${version}/verdicts`,
        body: {
          ...{ version, kind: "signed off", first: 1001, last: 1048, words: "As physics has it." },
          ...{ figures: "e09b5a71", after: null },
        },
      },
    ]);
  });

  it("needs the reason when frames are returned, and a whole number for each frame", async () => {
    const user = userEvent.setup();
    render(<DeclarationForm facts={facts} />);
    await user.click(screen.getByRole("radio", { name: /returned/ }));
    await user.clear(screen.getByLabelText("First frame"));
    await user.type(screen.getByLabelText(/To sign/), "e09b5a71");
    await user.click(screen.getByRole("button", { name: "Declare it returned" }));
    expect(await screen.findByText("A frame number.")).toBeVisible();
    await user.type(screen.getByLabelText("First frame"), "1001");
    await user.click(screen.getByRole("button", { name: "Declare it returned" }));
    expect(await screen.findByText("Say why the frames are returned.")).toBeVisible();
    expect(asked).toEqual([]);
  });

  it("puts the server's refusal beside its field, or above the act when it has none", async () => {
    const user = userEvent.setup();
    render(<DeclarationForm facts={facts} />);
    await user.click(screen.getByRole("radio", { name: /signed off/ }));
    await user.type(screen.getByLabelText(/To sign/), "deadbeef");
    const refuse = (error: object) => (answer = Response.json({ error }, { status: 400 }));
    refuse({ code: "invalid", field: "figures", message: "These are not the last eight figures." });
    await user.click(screen.getByRole("button", { name: "Declare it signed off" }));
    expect(await screen.findByText("These are not the last eight figures.")).toBeVisible();
    refuse({ code: "conflict", message: "Version 5 of LH-020 has been made since, and governs." });
    await user.click(screen.getByRole("button", { name: "Declare it signed off" }));
    expect(await screen.findByText(/Version 5 of LH-020 has been made since/)).toBeVisible();
  });
});
