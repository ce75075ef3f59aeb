import type { Page } from "playwright-core";

/**
 * Begins to note the time of every frame a page shows. Take them with `framesOf`.
 */
export async function beginFrames(page: Page): Promise<void> {
  await page.evaluate(() => {
    const times: number[] = [];
    Object.assign(window, { benchFrames: times });
    const note = (time: number): void => {
      if ((window as Window & { benchFrames?: number[] }).benchFrames !== times) return;
      times.push(time);
      requestAnimationFrame(note);
    };
    requestAnimationFrame(note);
  });
}

/** The lengths of the frames since `beginFrames`, ms. */
export async function framesOf(page: Page): Promise<number[]> {
  const times = await page.evaluate(() => {
    const bench = window as Window & { benchFrames?: number[] };
    const noted = bench.benchFrames ?? [];
    delete bench.benchFrames;
    return noted;
  });
  return times.slice(1).map((time, i) => time - times[i]);
}
