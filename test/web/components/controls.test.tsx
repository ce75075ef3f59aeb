import { act, render, screen } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { afterEach, describe, expect, it, vi } from "vitest";
import { initialsOf } from "../../../web/src/components/avatar.tsx";
import { Button } from "../../../web/src/components/button.tsx";
import { DataTable } from "../../../web/src/components/data-table.tsx";
import { ProgressLine } from "../../../web/src/components/progress-line.tsx";
import { SelectField } from "../../../web/src/components/select.tsx";
import { announce, StatusRegion } from "../../../web/src/components/status.tsx";
import { TextField } from "../../../web/src/components/text-field.tsx";

afterEach(() => vi.useRealTimers());

describe("a field", () => {
  it("carries its unit, its help and what is wrong as its description", () => {
    render(<TextField label="Preload" hint="N" help="Per face." error="Enter 0 or more." defaultValue="-3" />);
    const input = screen.getByLabelText("Preload");
    expect(input).toHaveAccessibleDescription("N Enter 0 or more. Per face.");
    expect(input).toBeInvalid();
    expect(input).toHaveValue("-3");
  });

  it("has a native select among its kinds", async () => {
    render(
      <SelectField
        label="Unit"
        choices={[
          { value: "N", label: "N" },
          { value: "kN", label: "kN" },
        ]}
      />,
    );
    await userEvent.selectOptions(screen.getByLabelText("Unit"), "kN");
    expect(screen.getByLabelText("Unit")).toHaveValue("kN");
    expect(screen.getByLabelText("Unit")).toBeValid();
  });
});

describe("a busy button", () => {
  it("keeps the focus and does nothing, sending no form either", async () => {
    const onClick = vi.fn();
    const onSubmit = vi.fn((event: React.FormEvent) => event.preventDefault());
    render(
      <form onSubmit={onSubmit}>
        <Button type="submit" isBusy onClick={onClick}>
          Save
        </Button>
      </form>,
    );
    await userEvent.click(screen.getByRole("button", { name: "Save" }));
    expect(screen.getByRole("button", { name: "Save" })).toHaveFocus();
    expect(onClick).not.toHaveBeenCalled();
    expect(onSubmit).not.toHaveBeenCalled();
  });
});

describe("an announcement", () => {
  it("is read out, and goes away by itself or by its cross", async () => {
    vi.useFakeTimers({ shouldAdvanceTime: true });
    render(<StatusRegion />);
    act(() => announce("Tomas Wik is editor now."));
    act(() => announce("Priya Raman is reader now."));
    expect(screen.getByRole("status")).toHaveTextContent(/Tomas Wik is editor now\..*Priya Raman is reader now\./u);
    await userEvent.click(screen.getAllByRole("button", { name: "Dismiss" })[0]);
    expect(screen.getByRole("status")).toHaveTextContent(/^Priya Raman is reader now\.$/u);
    act(() => void vi.advanceTimersByTime(8000));
    expect(screen.getByRole("status")).toBeEmptyDOMElement();
  });
});

describe("a table", () => {
  it("names its rows by their first cell and sums up at its foot", () => {
    render(
      <DataTable
        caption="Energy"
        columns={[
          { key: "name", head: "Over the run", cell: (row) => row.name },
          { key: "value", head: "mJ", isFigure: true, cell: (row) => row.value },
        ]}
        rows={[{ name: "Heat in the contact", value: "−220.289" }]}
        keyOf={(row) => row.name}
        sumRow={{ name: "Unaccounted for", value: "0.000" }}
      />,
    );
    expect(screen.getByRole("table", { name: "Energy" })).toBeInTheDocument();
    expect(screen.getByRole("columnheader", { name: "mJ" })).toBeInTheDocument();
    expect(screen.getByRole("row", { name: "Heat in the contact −220.289" })).toBeInTheDocument();
    expect(screen.getByRole("rowheader", { name: "Unaccounted for" })).toBeInTheDocument();
  });
});

describe("long work", () => {
  it("says how far it is and can be stopped", async () => {
    const onCancel = vi.fn();
    render(<ProgressLine label="Running" fraction={0.914} onCancel={onCancel} />);
    expect(screen.getByRole("progressbar", { name: "Running" })).toHaveAttribute("aria-valuenow", "91");
    await userEvent.click(screen.getByRole("button", { name: "Cancel" }));
    expect(onCancel).toHaveBeenCalledTimes(1);
  });
});

describe("initials", () => {
  it.each([
    ["Ines Duarte", "ID"],
    ["Maria de la Cruz", "MC"],
    ["  åsa ", "Å"],
    ["", ""],
  ])("of %j are %j", (name, initials) => expect(initialsOf(name)).toBe(initials));
});
