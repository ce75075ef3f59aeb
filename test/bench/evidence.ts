/*
 * What a person at the plots waits for: a trace of 200,000 samples to be drawn once the plots' library is there, and the
 * frames while the cursor is dragged and while the plots are made closer and wider. The built pages, a server and a
 * database of their own, a real browser without a screen. Nothing here is asserted.
 */
import { cpus, loadavg } from "node:os";
import { join } from "node:path";
import type { Page } from "playwright-core";
import { machineSlide } from "../../web/src/features/starting-points/cases/machine-slide.ts";
import { createProject, createScenario } from "../support/people.ts";
import { median } from "./measure.ts";
import { openSite } from "./page/bench-site.ts";
import { beginFrames, framesOf } from "./page/frames.ts";
import { timeDrawings } from "./page/drawings.ts";

const SECONDS = 4;
const MOVE_EVERY_MS = 16;
/** So long that 60 samples to a cycle of its own come to more than the 200,000 that are drawn at most. */
const lengths = [37, 38] as const;
const CHANGES = 12;

const { body } = machineSlide.scenario;
const cycles = (Math.sqrt(body.stiffness / body.inertia) / (2 * Math.PI)) * lengths[0];
const load = (): string => loadavg()[0].toFixed(2);
const ms = (value: number): string => `${value.toFixed(0)} ms`;

const site = await openSite(join(import.meta.dirname, "../../web/dist"));
try {
  if (60 * cycles < 200_000) throw new Error(`${lengths[0]} s are too short for 200,000 samples.`);
  console.log(`\n${cpus().length} × ${cpus()[0].model}, load ${load()}`);
  const projectId = await createProject(site.person);
  const scenario = { ...machineSlide.scenario, span: { ...machineSlide.scenario.span, seconds: lengths[0] } };
  const { id } = await createScenario(site.person, projectId, scenario);
  const page = await (await site.visit()).newPage();
  await page.goto(`/projects/${projectId}/scenarios/${id}`);
  await page.locator("[data-drawn=true]").nth(2).waitFor();
  await page.waitForLoadState("networkidle");
  await reportDrawing(page);
  await page.keyboard.press("Escape");
  await reportFrames(page, "cursor dragged", dragCursor);
  await reportFrames(page, "closer and wider", zoom);
} finally {
  await site.close();
}

/** The length changed to and fro: the first two times the run is computed, after that it is remembered and drawn alone. */
async function reportDrawing(page: Page): Promise<void> {
  await page.getByRole("button", { name: /^Length of the run: / }).click();
  const texts = Array.from({ length: CHANGES }, (_, i) => `${lengths[(i + 1) % 2]} s`);
  const before = load();
  const times = await timeDrawings(page, texts);
  const drawn = times.slice(2);
  console.log(
    `200,001 samples, change to drawn plots: computed ${ms(times[0])}; remembered, ${drawn.length} times: median ${ms(median(drawn))}, most ${ms(Math.max(...drawn))}, load ${before} to ${load()}`,
  );
}

async function reportFrames(page: Page, what: string, act: (page: Page, turn: number) => Promise<void>): Promise<void> {
  await page.getByRole("slider", { name: "Time cursor" }).scrollIntoViewIfNeeded();
  await beginFrames(page);
  const start = performance.now();
  for (let t = 0; t < SECONDS; t = (performance.now() - start) / 1000) {
    await act(page, t / 2);
    await page.waitForTimeout(MOVE_EVERY_MS);
  }
  const frames = (await framesOf(page)).sort((a, b) => a - b);
  const late = frames[Math.floor(0.95 * frames.length)];
  console.log(
    `${what}, 200,001 samples: median ${(1000 / median(frames)).toFixed(1)} frames a second, p95 of a frame ${ms(late)}, load ${load()}`,
  );
}

async function placeOf(page: Page, turn: number): Promise<{ x: number; y: number }> {
  const box = await page.getByRole("slider", { name: "Time cursor" }).boundingBox();
  if (!box) throw new Error("The plots are not to be seen.");
  return { x: box.x + box.width * (0.45 + 0.25 * Math.sin(2 * Math.PI * turn)), y: box.y + 100 };
}

async function dragCursor(page: Page, turn: number): Promise<void> {
  const { x, y } = await placeOf(page, turn);
  await page.mouse.move(x, y);
  await page.mouse.down();
}

/** By Ctrl and the wheel, a twentieth of a notch at a time, to and fro. */
async function zoom(page: Page, turn: number): Promise<void> {
  await page.mouse.up();
  await page.keyboard.down("Control");
  await page.mouse.wheel(0, turn % 1 < 0.5 ? -40 : 40);
  await page.keyboard.up("Control");
}
