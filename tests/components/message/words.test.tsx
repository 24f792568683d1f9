import { render, screen } from "@testing-library/react";
import { expect, it } from "vitest";
import { Empty } from "@/components/empty/empty";
import { Digest, groupDigest } from "@/components/figure/digest";
import { Message } from "@/components/message/message";

it("reads a message aloud: at once when it asks for something, in its turn otherwise", () => {
  render(
    <>
      <Message kind="work">Departure c has no reason.</Message>
      <Message kind="settled">Receipt signed.</Message>
      <Message announce={false}>It was always here.</Message>
    </>,
  );
  expect(screen.getByRole("alert")).toHaveTextContent("Departure c has no reason.");
  expect(screen.getAllByRole("status")).toHaveLength(1);
});

it("gives an empty place a heading of the level its page needs", () => {
  render(
    <Empty level={3} title="Nothing waits for you.">
      The next version is expected on 22 Oct.
    </Empty>,
  );
  expect(screen.getByRole("heading", { level: 3, name: "Nothing waits for you." })).toBeInTheDocument();
});

const digest = "7c1e90ab44d2f3180b6a71ce5f90d2a4c83e17b92ad46f0591fb38c7e09b5a71";

it("writes a digest in eights, and shortens it to its first two groups and its last", () => {
  expect(groupDigest(digest)).toHaveLength(8);
  expect(groupDigest(digest, true)).toEqual(["7c1e90ab", "44d2f318", "…", "e09b5a71"]);
});

it("marks the eight figures a signature repeats, and keeps the whole digest within reach of the short one", () => {
  render(
    <>
      <Digest digest={digest} markLast />
      <Digest digest={digest} short />
    </>,
  );
  expect(screen.getByText("e09b5a71")).toHaveClass("border-b");
  expect(screen.getByTitle(digest)).toHaveTextContent("7c1e90ab 44d2f318 … e09b5a71");
});
