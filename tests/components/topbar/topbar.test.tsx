import { render, screen } from "@testing-library/react";
import { expect, it, vi } from "vitest";
import { RoomChoice } from "@/components/topbar/room-choice";
import { SkipLink } from "@/components/topbar/skip-link";
import { Topbar } from "@/components/topbar/topbar";

const items = [
  { href: "/today", label: "Today", current: false },
  { href: "/shots", label: "Shots", current: true },
];

it("marks the current screen for the eye and the ear", () => {
  render(<Topbar items={items} />);
  expect(screen.getByRole("link", { name: "Shots" })).toHaveAttribute("aria-current", "page");
  expect(screen.getByRole("link", { name: "Today" })).not.toHaveAttribute("aria-current");
});

it("says the production, the person and their role", () => {
  render(<Topbar items={items} production="Lantern Reach" person="Imke Varandel" role="science advisor" />);
  expect(screen.getByRole("banner")).toHaveTextContent(/Lantern Reach.·.Imke Varandel, science advisor/);
});

it("has no navigation before sign-in", () => {
  render(<Topbar items={[]} />);
  expect(screen.queryByRole("navigation")).toBeNull();
  expect(screen.getByRole("link", { name: "Ringwright" })).toBeInTheDocument();
});

it.each([
  ["desk", "Read this page dark"],
  ["viewing", "Read this page light"],
] as const)("offers the other room from the %s, for pages of the same kind", (room, name) => {
  const { container } = render(
    <RoomChoice native="desk" room={room} onChoose={vi.fn(async () => undefined)} />,
  );
  expect(screen.getByRole("button", { name })).toHaveAttribute("type", "submit");
  expect(container.querySelector("input[name=native]")).toHaveValue("desk");
});

it("leads the keyboard past the bar", () => {
  render(<SkipLink />);
  expect(screen.getByRole("link", { name: "Skip to content" })).toHaveAttribute("href", "#content");
});
