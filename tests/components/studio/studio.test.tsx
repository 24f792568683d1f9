import { render, screen } from "@testing-library/react";
import { describe, expect, it } from "vitest";
import { LogPage, type LogPageProps } from "@/components/studio/log-page";
import { momentOf } from "@/components/studio/moments";
import { splitLinks } from "@/components/studio/split-links";

const log: LogPageProps = {
  chain: "11111111-1111-4111-8111-111111111111",
  name: "Ember Harbour",
  logs: [],
  total: 214,
  brokenAt: null,
  lines: [
    {
      seq: 214,
      at: "2031-10-20T07:04:11Z",
      sentence: "Odo Ferrand joined as advisor.",
      hash: "ab".repeat(32),
    },
  ],
  older: 114,
  timeZone: "Europe/Oslo",
  places: [],
};

describe("the log's page", () => {
  it("says that the chain is whole and shows each line in the reader's time zone", () => {
    render(<LogPage {...log} />);
    expect(screen.getByText(/The chain is whole: 214 lines/)).toBeInTheDocument();
    expect(screen.getByText("20 Oct 2031, 09:04:11")).toHaveAttribute("datetime", "2031-10-20T07:04:11Z");
    expect(screen.getByRole("link", { name: "Older lines" })).toHaveAttribute(
      "href",
      expect.stringContaining("before=114"),
    );
    expect(screen.queryByRole("link", { name: "Newest lines" })).toBeNull();
  });

  it("says at which line a chain is broken", () => {
    render(<LogPage {...log} brokenAt={57} />);
    expect(screen.getByText(/The chain is broken at line 57/)).toBeInTheDocument();
    expect(screen.queryByText(/whole:/)).toBeNull();
  });

  it("is content when nothing has happened", () => {
    render(<LogPage {...log} total={0} lines={[]} older={null} />);
    expect(screen.getByText("Nothing has happened here yet.")).toBeInTheDocument();
  });
});

describe("words of the studio", () => {
  it("tell the time where the reader is", () => {
    expect(momentOf("2031-01-01T00:30:00Z", "America/New_York")).toBe("31 Dec 2030, 19:30:00");
  });
});

describe("a letter's text", () => {
  it("has its addresses apart, without the full stop that ends their sentence", () => {
    expect(
      splitLinks("Open http://127.0.0.1:3000/invitation/a-_b. Or (see https://ringwright.example/x)."),
    ).toEqual([
      { text: "Open " },
      { text: "http://127.0.0.1:3000/invitation/a-_b", href: "http://127.0.0.1:3000/invitation/a-_b" },
      { text: ". Or (see " },
      { text: "https://ringwright.example/x", href: "https://ringwright.example/x" },
      { text: ")." },
    ]);
  });

  it("makes a link of nothing but the web", () => {
    expect(splitLinks("javascript:alert(1) ftp://x")).toEqual([{ text: "javascript:alert(1) ftp://x" }]);
  });
});
