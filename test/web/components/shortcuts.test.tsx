import { fireEvent, render, screen } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import { useShortcut, useShortcutsDialog } from "../../../web/src/components/shortcuts.tsx";
import { allowDialogs } from "../support/missing-in-jsdom.ts";

function Page({ onNew, onUndo }: { onNew: () => void; onUndo: () => void }) {
  useShortcut("n", "New scenario", onNew);
  useShortcut("Ctrl+z", "Undo", onUndo);
  const { open, dialog } = useShortcutsDialog();
  return (
    <>
      <button type="button" onClick={open}>
        Keys
      </button>
      <input aria-label="Title" />
      {dialog}
    </>
  );
}

beforeEach(allowDialogs);
afterEach(() => localStorage.clear());

function show() {
  const onNew = vi.fn();
  const onUndo = vi.fn();
  const view = render(<Page onNew={onNew} onUndo={onUndo} />);
  return { user: userEvent.setup(), onNew, onUndo, view };
}

describe("shortcuts", () => {
  it("are the same while Caps Lock turns letters round", () => {
    const { onUndo, onNew } = show();
    fireEvent.keyDown(document.body, { key: "Z", ctrlKey: true });
    fireEvent.keyDown(document.body, { key: "N" });
    expect([onUndo, onNew].map(({ mock }) => mock.calls.length)).toEqual([1, 1]);
    fireEvent.keyDown(document.body, { key: "z", ctrlKey: true, shiftKey: true });
    expect(onUndo).toHaveBeenCalledTimes(1);
  });

  it("run while the component is there, and no longer", async () => {
    const { user, onNew, view } = show();
    await user.keyboard("n");
    expect(onNew).toHaveBeenCalledTimes(1);
    view.unmount();
    await user.keyboard("n");
    expect(onNew).toHaveBeenCalledTimes(1);
  });

  it("leave a person who writes alone, except for keys with Ctrl", async () => {
    const { user, onNew, onUndo } = show();
    await user.type(screen.getByLabelText("Title"), "new{Control>}z{/Control}");
    expect(onNew).not.toHaveBeenCalled();
    expect(onUndo).toHaveBeenCalledTimes(1);
  });

  it("can be turned off for single keys, and that is remembered", async () => {
    const { user, onNew, onUndo } = show();
    await user.click(screen.getByRole("button", { name: "Keys" }));
    await user.click(screen.getByRole("checkbox", { name: /^Use single keys/u }));
    await user.click(screen.getByRole("button", { name: "Close" }));
    await user.keyboard("n{Control>}z{/Control}");
    expect(onNew).not.toHaveBeenCalled();
    expect(onUndo).toHaveBeenCalledTimes(1);
    expect(localStorage.getItem("restband-shortcuts")).toBe("off");
    await user.click(screen.getByRole("button", { name: "Keys" }));
    await user.click(screen.getByRole("checkbox", { name: /^Use single keys/u }));
    await user.click(screen.getByRole("button", { name: "Close" }));
    await user.keyboard("n");
    expect(onNew).toHaveBeenCalledTimes(1);
  });
});
