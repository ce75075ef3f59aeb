/*
 * What a person at the page waits for: the JavaScript before the first paint, the answer after a change, the frames while
 * a value is dragged and while a long list is scrolled. The built pages, a server and a database of their own, a real
 * browser without a screen. Nothing here is asserted.
 */
import { cpus, loadavg } from "node:os";
import { join } from "node:path";
import type { Page } from "playwright-core";
import { machineSlide } from "../../web/src/features/starting-points/cases/machine-slide.ts";
import { createProject, createScenario } from "../support/people.ts";
import { openSite, type BenchSite } from "./page/bench-site.ts";
import { timeChanges } from "./page/changes.ts";
import { drag } from "./page/drag.ts";
import { measureList } from "./page/long-list.ts";
import { scriptsBeforePaint } from "./page/scripts-before-paint.ts";
import { median } from "./measure.ts";

const CHANGES = 60;
/** So long that the slide sticks and slips twenty times. */
const typical = { ...machineSlide.scenario, span: { ...machineSlide.scenario.span, seconds: 0.37 } };

const load = (): string => loadavg()[0].toFixed(2);
const quantile = (values: readonly number[], share: number): number =>
  [...values].sort((a, b) => a - b)[Math.min(values.length - 1, Math.floor(share * values.length))];
const ms = (value: number): string => `${value.toFixed(1)} ms`;

const site = await openSite(join(import.meta.dirname, "../../web/dist"));
try {
  console.log(`\n${cpus().length} × ${cpus()[0].model}, load ${load()}`);
  const projectId = await createProject(site.person);
  const { id } = await createScenario(site.person, projectId, typical);
  const address = `/projects/${projectId}/scenarios/${id}`;
  await reportScripts(site, { scenario: address, project: `/projects/${projectId}`, "all projects": "/projects" });
  await reportScenario(site, address);
  await reportList(site);
} finally {
  await site.close();
}

async function reportScripts(at: BenchSite, addresses: Record<string, string>): Promise<void> {
  for (const [name, address] of Object.entries(addresses)) {
    const { kB, firstPaint, content } = await scriptsBeforePaint(at, address);
    const when = `first paint after ${ms(firstPaint)}, its content after ${ms(content)}`;
    console.log(`${name}: ${when}, with ${kB.toFixed(1)} kB of scripts come by then, load ${load()}`);
  }
}

async function reportScenario(at: BenchSite, address: string): Promise<void> {
  const context = await at.visit();
  const page = await context.newPage();
  await page.goto(address);
  await plotsAreThere(page);
  await page.getByRole("button", { name: /^Damping: / }).click();
  const texts = Array.from({ length: CHANGES }, (_, i) => String(15_000 + 20 * i));
  const before = load();
  const times = await timeChanges(page, texts);
  console.log(
    `changed value to painted answer, ${times.length} changes: median ${ms(median(times))}, p95 ${ms(quantile(times, 0.95))}, most ${ms(Math.max(...times))}, load ${before} to ${load()}`,
  );
  const { frames, answersPerSecond } = await drag(page);
  console.log(
    `dragging, plots there: median ${(1000 / median(frames)).toFixed(1)} frames a second, p95 of a frame ${ms(quantile(frames, 0.95))}, ${answersPerSecond.toFixed(1)} answers a second, load ${load()}`,
  );
  await context.close();
}

/** All three plots drawn by their library, and what is read in the background done. */
async function plotsAreThere(page: Page): Promise<void> {
  await page.locator("[data-drawn=true]").nth(2).waitFor();
  await page.waitForLoadState("networkidle");
}

async function reportList(at: BenchSite): Promise<void> {
  const list = await measureList(at, 1000);
  console.log(
    `project of ${list.count} scenarios: list ${(list.bytes / 1000).toFixed(0)} kB (${(list.transferred / 1000).toFixed(0)} kB sent), shown after ${ms(list.shown)}`,
  );
  console.log(
    `scrolling it: median ${(1000 / median(list.frames)).toFixed(1)} frames a second, p95 of a frame ${ms(quantile(list.frames, 0.95))}, load ${load()}`,
  );
}
