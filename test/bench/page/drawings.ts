import type { Page } from "playwright-core";
import { timeTexts } from "./typed-texts.ts";

/** From each change of the value whose editor is open to the frame that shows its plots, ms. */
export async function timeDrawings(page: Page, texts: readonly string[]): Promise<number[]> {
  await watchPlots(page);
  return timeTexts(page, texts, () => page.evaluate(() => (window as unknown as BenchWindow).benchDrawn()));
}

interface BenchWindow extends Window {
  benchDrawn(): Promise<number>;
}

/** Plots are drawn when nothing has been changed in them for this long, ms; that time does not count. */
const QUIET_MS = 1500;

/** From the input event's own time stamp to after the last frame in which something of a plot was drawn anew. */
async function watchPlots(page: Page): Promise<void> {
  await page.evaluate((quiet) => {
    const benchDrawn = (): Promise<number> =>
      new Promise((resolve) => {
        window.addEventListener(
          "input",
          ({ timeStamp }) => {
            let last = 0;
            const painted = (): void => {
              requestAnimationFrame(() => {
                const { port1, port2 } = new MessageChannel();
                port1.onmessage = () => (last = performance.now());
                port2.postMessage(null);
              });
            };
            const observer = new MutationObserver(painted);
            for (const plot of document.querySelectorAll("[data-drawn]"))
              observer.observe(plot, { subtree: true, childList: true, attributes: true });
            const timer = setInterval(() => {
              if (last === 0 || performance.now() - last < quiet) return;
              clearInterval(timer);
              observer.disconnect();
              resolve(last - timeStamp);
            }, 50);
          },
          { capture: true, once: true },
        );
      });
    Object.assign(window, { benchDrawn });
  }, QUIET_MS);
}
