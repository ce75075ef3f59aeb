import { vi } from "vitest";

/** jsdom knows the dialog element but cannot open it: opened here without the browser's focus trap. */
export function allowDialogs(): void {
  HTMLDialogElement.prototype.showModal = function () {
    this.open = true;
  };
  HTMLDialogElement.prototype.close = function () {
    this.open = false;
    this.dispatchEvent(new Event("close"));
  };
}

/** jsdom lays nothing out: nothing scrolls, and nothing comes into sight. */
export function allowLayout(): void {
  window.scrollTo = () => undefined;
  vi.stubGlobal(
    "IntersectionObserver",
    class {
      observe(): void {}
      disconnect(): void {}
    },
  );
}
