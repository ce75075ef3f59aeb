import { solverVersion, type Scenario, type SweepPlan } from "@restband/solver";
import type { Page } from "playwright-core";
import type { StoredExploration } from "../../../api/src/contract.ts";
import { sweepToKeep } from "../../../web/src/features/explore/sweep/stored-sweep.ts";
import { addMember, createProject, createScenario } from "../../support/people.ts";
import type { BenchSite } from "./bench-site.ts";
import { beginFrames, framesOf } from "./frames.ts";

export interface PageSweep {
  /** From the click that begins it until no cell is missing, s. */
  readonly computed: number;
  /** Until the server has all its tiles; as long where none are kept. */
  readonly stored: number;
  /** Lengths of the frames meanwhile, ms. */
  readonly frames: number[];
  /** The most memory the page has had before it began, and at its end, MB. */
  readonly memory: { readonly before: number; readonly after: number };
}

/** A project with a scenario to be swept, seen by somebody who may save and by somebody who may only read. */
export async function sweptScenario({ person, other }: BenchSite, scenario: Scenario) {
  const projectId = await createProject(person, "A sweep");
  await addMember(person, projectId, other.email, "reader");
  return { projectId, scenarioId: (await createScenario(person, projectId, scenario)).id };
}

interface PageSweepSettings {
  readonly scenario: Scenario;
  readonly plan: SweepPlan;
  readonly workers: number;
  /** Whether its tiles go to the server as they come. */
  readonly isKept: boolean;
}

/** Runs a sweep on its page in a browser of its own, in so many workers. */
export async function measurePageSweep(
  site: BenchSite,
  { projectId, scenarioId }: Awaited<ReturnType<typeof sweptScenario>>,
  { scenario, plan, workers, isKept }: PageSweepSettings,
): Promise<PageSweep> {
  const about = { title: "The bench’s sweep", scenarioVersion: 1, solverVersion };
  const body = sweepToKeep({ plan, seconds: scenario.span.seconds }, about);
  const { id, tiles } = await site.person.get<StoredExploration>("createExploration", {
    params: { projectId, scenarioId },
    body,
  });
  const context = await site.visit(isKept ? site.person : site.other);
  // the page takes all cores but one
  await context.addInitScript((cores) => {
    Object.defineProperty(navigator, "hardwareConcurrency", { value: cores });
  }, workers + 1);
  const page = await context.newPage();
  await page.goto(`/projects/${projectId}/scenarios/${scenarioId}/explore/${id}`);
  await page.getByRole("button", { name: "Resume" }).waitFor();
  await page.waitForLoadState("networkidle");
  const before = await site.pageMemory();
  await beginFrames(page);
  const begun = performance.now();
  await page.getByRole("button", { name: "Resume" }).click();
  await isComplete(page);
  const computed = (performance.now() - begun) / 1000;
  const frames = await framesOf(page);
  while (isKept && (await savedOf(site, projectId, id)) < tiles) await page.waitForTimeout(20);
  const stored = (performance.now() - begun) / 1000;
  const memory = { before, after: await site.pageMemory() };
  await context.close();
  return { computed, stored, frames, memory };
}

const savedOf = async ({ person }: BenchSite, projectId: string, explorationId: string): Promise<number> =>
  (await person.get<StoredExploration>("readExploration", { params: { projectId, explorationId } })).tilesSaved;

/** Its progress comes and goes again. */
async function isComplete(page: Page): Promise<void> {
  const progress = page.getByRole("progressbar", { name: "Running the cells" });
  await progress.waitFor();
  await progress.waitFor({ state: "detached", timeout: 600_000 });
}
