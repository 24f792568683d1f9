import { render, screen, within } from "@testing-library/react";
import { expect, it } from "vitest";
import { RowLink } from "@/components/table/row-link";
import { Cell, FigureCell, GroupRow, HeadCell, Row, Table } from "@/components/table/table";

it("is a table to every reader: columns, groups and rows by name", () => {
  render(
    <Table aria-label="Shots">
      <thead>
        <tr>
          <HeadCell>shot</HeadCell>
          <HeadCell>due</HeadCell>
        </tr>
      </thead>
      <tbody>
        <GroupRow colSpan={2}>Approach</GroupRow>
        <Row chosen>
          <Cell>
            <RowLink href="/shots/LR-010">LR-010</RowLink>
          </Cell>
          <FigureCell>24 Oct</FigureCell>
        </Row>
      </tbody>
    </Table>,
  );
  const table = screen.getByRole("table", { name: "Shots" });
  expect(
    within(table)
      .getAllByRole("columnheader")
      .map(({ textContent }) => textContent),
  ).toEqual(["shot", "due"]);
  expect(within(table).getByRole("rowheader", { name: "Approach" })).toHaveAttribute("colspan", "2");
  expect(within(table).getByRole("row", { name: "LR-010 24 Oct" })).toHaveAttribute("data-chosen", "true");
  expect(within(table).getByRole("link", { name: "LR-010" })).toHaveAttribute("data-row-link");
});
