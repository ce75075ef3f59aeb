import type { Page } from "playwright-core";
import { timeTexts } from "./typed-texts.ts";

/** What became of the changes of a value: from the moment each was typed to the frame that shows its answer, ms. */
export async function timeChanges(page: Page, texts: readonly string[]): Promise<number[]> {
  await watchAnswer(page);
  const painted = (): Promise<number> => page.evaluate(() => (window as unknown as BenchWindow).benchPainted());
  // As a person does, who reads the answer before typing again: what is drawn later is drawn meanwhile.
  return timeTexts(page, texts, painted, READING_MS);
}

const READING_MS = 400;

interface BenchWindow extends Window {
  /** The next change's time from its input to the frame that shows its answer, ms. */
  benchPainted(): Promise<number>;
}

/**
 * From the input event's own time stamp to after the frame in which the answer is no longer marked as busy: that frame's
 * style, layout and painting are in it.
 */
async function watchAnswer(page: Page): Promise<void> {
  await page.evaluate(() => {
    const answer = document.querySelector("[aria-busy]");
    if (!answer) throw new Error("The page has no answer.");
    const painted = (): Promise<number> =>
      new Promise((resolve) => {
        requestAnimationFrame(() => {
          const { port1, port2 } = new MessageChannel();
          port1.onmessage = () => resolve(performance.now());
          port2.postMessage(null);
        });
      });
    const benchPainted = (): Promise<number> =>
      new Promise((resolve) => {
        window.addEventListener(
          "input",
          ({ timeStamp }) => {
            let wasBusy = false;
            const observer = new MutationObserver(() => {
              const isBusy = answer.getAttribute("aria-busy") === "true";
              wasBusy ||= isBusy;
              if (isBusy || !wasBusy) return;
              observer.disconnect();
              void painted().then((time) => resolve(time - timeStamp));
            });
            observer.observe(answer, { attributes: true, attributeFilter: ["aria-busy"] });
          },
          { capture: true, once: true },
        );
      });
    Object.assign(window, { benchPainted });
  });
}
