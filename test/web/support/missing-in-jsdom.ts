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

class IdleObserver {
  observe(): void {}
  unobserve(): void {}
  disconnect(): void {}
}

/** jsdom lays nothing out: nothing scrolls, nothing comes into sight, nothing changes its size. */
export function allowLayout(): void {
  window.scrollTo = () => undefined;
  vi.stubGlobal("IntersectionObserver", IdleObserver);
  vi.stubGlobal("ResizeObserver", IdleObserver);
}
