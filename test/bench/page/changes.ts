import type { Page } from "playwright-core";

/** What became of the changes of a value: from the moment each was typed to the frame that shows its answer, ms. */
export async function timeChanges(page: Page, texts: readonly string[]): Promise<number[]> {
  await watchAnswer(page);
  const field = page
    .getByRole("group", { name: /^Change / })
    .getByRole("textbox")
    .first();
  const times: number[] = [];
  for (const text of texts) {
    const painted = page.evaluate(() => (window as unknown as BenchWindow).benchPainted());
    await field.fill(text);
    times.push(await painted);
    // As a person does, who reads the answer before typing again: what is drawn later is drawn meanwhile.
    await page.waitForTimeout(400);
  }
  return times;
}

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
