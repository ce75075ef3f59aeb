import type { BenchSite } from "./bench-site.ts";

export interface BeforePaint {
  /** Scripts that had come when the page's own content was first painted, as they were sent, kB. */
  readonly kB: number;
  /** From the address to the first paint of anything, ms. */
  readonly firstPaint: number;
  /** From the address to the first frame with content of the page's own, ms. */
  readonly content: number;
}

/** Opens an address in a browser that has nothing in its cache. Workers' scripts run beside the page and are not counted. */
export async function scriptsBeforePaint(site: BenchSite, address: string): Promise<BeforePaint> {
  const context = await site.visit();
  const page = await context.newPage();
  await page.addInitScript(() => {
    const benchShown = new Promise<number>((resolve) => {
      const watch = (): void => {
        const isThere = document.querySelector("main h1, main h2") !== null;
        requestAnimationFrame(isThere ? () => resolve(performance.now()) : watch);
      };
      requestAnimationFrame(watch);
    });
    Object.assign(window, { benchShown });
  });
  await page.goto(address);
  const measured = await page.evaluate(async () => {
    const shown = await (window as unknown as { benchShown: Promise<number> }).benchShown;
    const resources = performance.getEntriesByType("resource") as PerformanceResourceTiming[];
    const scripts = resources.filter(({ name, responseEnd }) => name.endsWith(".js") && responseEnd <= shown);
    const firstPaint = performance.getEntriesByType("paint")[0]?.startTime ?? NaN;
    return {
      kB: scripts.reduce((sum, { encodedBodySize }) => sum + encodedBodySize, 0) / 1000,
      firstPaint,
      content: shown,
    };
  });
  await context.close();
  return measured;
}
