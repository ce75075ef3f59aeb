import { fireEvent, render, screen, waitFor } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { beforeEach, describe, expect, it, vi } from "vitest";
import { Confirm } from "../../../web/src/components/confirm.tsx";
import { Dialog } from "../../../web/src/components/dialog.tsx";
import { allowDialogs } from "../support/missing-in-jsdom.ts";

beforeEach(allowDialogs);

describe("a dialog", () => {
  it("is named by its title and has the focus where it is marked", () => {
    render(
      <Dialog isOpen title="New project" onClose={() => undefined}>
        <input aria-label="Name" data-first-focus />
      </Dialog>,
    );
    expect(screen.getByRole("dialog", { name: "New project" })).toBeInTheDocument();
    expect(screen.getByLabelText("Name")).toHaveFocus();
  });

  it("is left by its cross and by Escape, unless it wants an answer", async () => {
    const onClose = vi.fn();
    const { rerender } = render(<Dialog isOpen title="Keys" onClose={onClose} children="text" />);
    await userEvent.click(screen.getByRole("button", { name: "Close" }));
    fireEvent(screen.getByRole("dialog"), new Event("cancel", { cancelable: true }));
    expect(onClose).toHaveBeenCalledTimes(2);
    rerender(<Dialog isOpen title="Keys" canClose={false} onClose={onClose} children="text" />);
    fireEvent(screen.getByRole("dialog"), new Event("cancel", { cancelable: true }));
    expect(screen.queryByRole("button", { name: "Close" })).not.toBeInTheDocument();
    expect(onClose).toHaveBeenCalledTimes(2);
  });
});

describe("asking once more", () => {
  const open = (onConfirm: () => Promise<unknown>, onClose = vi.fn()) => {
    render(
      <Confirm isOpen title="Remove Tomas Wik" action="Remove" onConfirm={onConfirm} onClose={onClose}>
        What they made stays.
      </Confirm>,
    );
    return onClose;
  };

  it("has the focus on what changes nothing", () => {
    open(() => Promise.resolve());
    expect(screen.getByRole("button", { name: "Cancel" })).toHaveFocus();
  });

  it("closes when it is done", async () => {
    const onClose = open(() => Promise.resolve());
    await userEvent.click(screen.getByRole("button", { name: "Remove" }));
    await waitFor(() => expect(onClose).toHaveBeenCalledTimes(1));
  });

  it("stays and says why where it is refused", async () => {
    const onClose = open(() => Promise.reject(new Error("A project keeps at least one owner.")));
    await userEvent.click(screen.getByRole("button", { name: "Remove" }));
    expect(await screen.findByRole("alert")).toHaveTextContent("A project keeps at least one owner.");
    expect(onClose).not.toHaveBeenCalled();
  });
});
