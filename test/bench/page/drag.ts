import type { Page } from "playwright-core";
import { beginFrames, framesOf } from "./frames.ts";

export interface Drag {
  /** Lengths of the frames while the value was dragged, ms. */
  readonly frames: number[];
  /** Answers shown in each second of it. */
  readonly answersPerSecond: number;
}

const SECONDS = 4;
const MOVE_EVERY_MS = 16;

/** Drags the value whose editor is open to and fro along its ruler, as evenly as a hand does. */
export async function drag(page: Page): Promise<Drag> {
  const ruler = page.getByRole("slider").first();
  await ruler.scrollIntoViewIfNeeded();
  const box = await ruler.boundingBox();
  if (!box) throw new Error("The ruler is not to be seen.");
  const at = (turn: number): number => box.x + box.width * (0.5 + 0.2 * Math.sin(2 * Math.PI * turn));
  const y = box.y + box.height / 2;
  await page.mouse.move(at(0), y);
  await page.mouse.down();
  await countAnswers(page);
  await beginFrames(page);
  const start = performance.now();
  for (let t = 0; t < SECONDS; t = (performance.now() - start) / 1000) {
    await page.mouse.move(at(t / 2), y);
    await page.waitForTimeout(MOVE_EVERY_MS);
  }
  const frames = await framesOf(page);
  const answers = await page.evaluate(() => (window as unknown as CountingWindow).benchAnswers());
  await page.mouse.up();
  return { frames, answersPerSecond: answers / SECONDS };
}

interface CountingWindow extends Window {
  benchAnswers(): number;
}

/** Counts the frames in which the answer's own strip is drawn anew. */
async function countAnswers(page: Page): Promise<void> {
  await page.evaluate(() => {
    const strip = document.querySelector("[aria-busy] [aria-label='Motion now']");
    if (!strip) throw new Error("The answer has no strip.");
    let answers = 0;
    let frame = 0;
    const observer = new MutationObserver(() => {
      if (frame !== 0) return;
      answers += 1;
      frame = requestAnimationFrame(() => (frame = 0));
    });
    observer.observe(strip, { subtree: true, childList: true, attributes: true });
    const benchAnswers = (): number => {
      observer.disconnect();
      return answers;
    };
    Object.assign(window, { benchAnswers });
  });
}
