import type { StoredScenario } from "../../../api/src/contract.ts";
import { drawer } from "../../../web/src/features/starting-points/cases/drawer.ts";
import { createProject } from "../../support/people.ts";
import type { BenchSite } from "./bench-site.ts";
import { beginFrames, framesOf } from "./frames.ts";

export interface LongList {
  readonly count: number;
  /** The list as text, and as it was sent, bytes. */
  readonly bytes: number;
  readonly transferred: number;
  /** From the address to the first row, ms. */
  readonly shown: number;
  /** Lengths of the frames while it was scrolled, ms. */
  readonly frames: number[];
}

const AT_ONCE = 500;
const SCROLL_SECONDS = 4;

/** Opens a project of so many scenarios, no two alike, and scrolls through it by the wheel. */
export async function measureList(site: BenchSite, count: number): Promise<LongList> {
  const projectId = await createProject(site.person, "A long list");
  for (let first = 0; first < count; first += AT_ONCE)
    await createCases(site, projectId, first, Math.min(AT_ONCE, count - first));
  const context = await site.visit();
  const page = await context.newPage();
  const start = performance.now();
  const listed = page.waitForResponse((response) => response.url().endsWith("/scenarios"));
  await page.goto(`/projects/${projectId}`);
  await page
    .getByRole("link", { name: /^Case / })
    .first()
    .waitFor();
  const shown = performance.now() - start;
  const response = await listed;
  const { responseBodySize: transferred } = await response.request().sizes();
  const bytes = (await response.body()).length;
  await page.mouse.move(600, 600);
  await beginFrames(page);
  const begin = performance.now();
  while (performance.now() - begin < 1000 * SCROLL_SECONDS) {
    await page.mouse.wheel(0, 120);
    await page.waitForTimeout(16);
  }
  const frames = await framesOf(page);
  await context.close();
  return { count, bytes, transferred, shown, frames };
}

async function createCases({ person }: BenchSite, projectId: string, first: number, count: number): Promise<void> {
  const { scenario } = drawer;
  const contents = Array.from({ length: count }, (_, i) => ({
    ...scenario,
    title: `Case ${first + i + 1}`,
    body: { ...scenario.body, inertia: scenario.body.inertia * (1 + (first + i) / 1000) },
  }));
  await person.get<StoredScenario[]>("createCases", { params: { projectId }, body: { contents } });
}
