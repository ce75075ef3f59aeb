import type { Page } from "playwright-core";

/**
 * Types texts into the value whose editor is open, one after another, and measures each.
 *
 * @param next a promise in the page that tells how long the next change takes, ms
 * @param pause between two texts, ms
 */
export async function timeTexts(
  page: Page,
  texts: readonly string[],
  next: () => Promise<number>,
  pause = 0,
): Promise<number[]> {
  const field = page
    .getByRole("group", { name: /^Change / })
    .getByRole("textbox")
    .first();
  const times: number[] = [];
  for (const text of texts) {
    const taken = next();
    await field.fill(text);
    times.push(await taken);
    await page.waitForTimeout(pause);
  }
  return times;
}
