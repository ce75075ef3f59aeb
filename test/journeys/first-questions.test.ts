import type { Page } from "playwright-core";
import { afterAll, afterEach, beforeAll, expect, it } from "vitest";
import { noStopMotion } from "../support/den-hartog.ts";
import { feedCycle } from "../support/feed-cycle.ts";
import { Journey } from "../support/journey.ts";
import { createProject, emailOf, signUp } from "../support/people.ts";
import {
  answerOf,
  beginScenario,
  change,
  choose,
  expectLength,
  expectText,
  openScenario,
  savingOf,
  signIn,
} from "../support/steps.ts";

let journey: Journey;
let ada: Awaited<ReturnType<typeof signUp>>;
let page: Page;
beforeAll(async () => {
  journey = await Journey.open();
  ada = await signUp(journey.server, "Ada");
});
afterAll(() => journey.close());
afterEach(() => expect(journey.complaints.splice(0)).toEqual([]));

it("does friction damp this isolator at resonance, and by how much", async () => {
  // Of the starting point: 50 kg on 49.348 kN/m and 157 N·s/m, two faces of 150 N at 0.2, a floor of 2 mm at 5 Hz.
  const [mass, stiffness, damping, friction, floor, omega] = [50, 49_348, 157, 0.2 * 2 * 150, 0.002, 10 * Math.PI];
  const ratio = damping / (2 * Math.sqrt(stiffness * mass));
  const r = omega / Math.sqrt(stiffness / mass);
  // Seen from the floor the instrument is a body under m Ω² Y cos Ωt.
  const push = mass * omega ** 2 * floor;

  await arrive("Isolator");
  await beginFrom("Friction-damped isolator at resonance");
  await page.getByRole("button", { name: "spectrum", exact: true }).click();
  // Den Hartog 1931: the exact motion without stops, its turning point at t = 0.
  const rubbed = noStopMotion(r, ratio, friction / push);
  await expectReach((rubbed.amplitude * push) / stiffness);
  // Between turning points friction is one force: a square wave, 4F/π at the drive's rate (Fourier), behind it a quarter turn.
  const phase = (rubbed.phase * Math.PI) / 180;
  const drive = { re: push * Math.cos(phase), im: push * Math.sin(phase) - (4 * friction) / Math.PI };
  const mount = { re: stiffness - mass * omega ** 2, im: damping * omega };
  const size = mount.re ** 2 + mount.im ** 2;
  const swing = Math.hypot(
    (drive.re * mount.re + drive.im * mount.im) / size + floor * Math.cos(phase),
    (drive.im * mount.re - drive.re * mount.im) / size + floor * Math.sin(phase),
  );
  await expectFirstOrder(swing);

  await change(page, "Kinetic friction", "0");
  await change(page, "Static friction", "0");
  // Textbook, without friction: from the floor Y r²/q, over all Y √(1 + (2ζr)²)/q, q = √((1 − r²)² + (2ζr)²).
  const q = Math.hypot(1 - r * r, 2 * ratio * r);
  const transmitted = Math.hypot(1, 2 * ratio * r) / q;
  await expectReach((floor * r * r) / q);
  await expectFirstOrder(floor * transmitted);
  await expectText(page.getByRole("list", { name: "Limits", exact: true })).toMatch(
    new RegExp(`broken.* · ${transmitted.toFixed(1)}`),
  );
});

it("how far off target does a move end, and where was it lost", async () => {
  // 120 kg pressed by its weight and 800 N, 0.12 at rest and sliding, fed 0.6 mm at 2 mm/s through 4 N/μm at ζ of a half.
  const [stiffness, speed, damping] = [4e6, 2e-3, 21_909];
  const omega = Math.sqrt(stiffness / 120);
  const ratio = damping / (2 * Math.sqrt(stiffness * 120));
  await arrive("Positioning");
  await beginCarriage({ damping, fixed: 0.12, sliding: 0.12 });
  await page.getByRole("button", { name: "all fields of Drive" }).click();
  await page.getByLabel("Stop", { exact: true }).fill("0.3 s");
  await page.getByRole("button", { name: "Back to the sentence" }).click();
  await change(page, "Length of the run", "1 s");
  await expectText(answerOf(page)).toContain("comes to rest");

  // While it slides at the drive's speed the spring carries friction alone: Fk/k behind (Coulomb).
  const behind = (0.12 * pressing) / stiffness;
  const cursor = page.getByRole("slider", { name: "Time cursor" });
  await seeByDragging(0.2 / (await lengthShown()), 0.3 / (await lengthShown()));
  await pressStrip(0.5);
  await expectLength(page, "behind drive").toBeCloseTo(-behind, 8);
  // The drive stands: from there it goes on at V, by (V/ω) e^(−ζ acos ζ/√(1 − ζ²)) (textbook: the peak after an impulse).
  const gained = (speed / omega) * Math.exp((-ratio * Math.acos(ratio)) / Math.sqrt(1 - ratio ** 2));
  await cursor.press("End");
  await expectLength(page, "behind drive").toBeCloseTo(gained - behind, 8);
});

it("which of two way materials is smoother", async () => {
  const iron = {
    mass: 120,
    stiffness: 4e6,
    damping: 1500,
    holding: 0.15 * pressing,
    sliding: 0.12 * pressing,
    feed: 2e-3,
  };
  const { firstBreakAway, slipTime, stickTime, slipDistance } = feedCycle(iron);
  const period = slipTime + stickTime;
  // To the middle of the stick after the 70th slip.
  const length = Number((firstBreakAway + 69 * period + slipTime + stickTime / 2).toFixed(4));
  await arrive("Ways");
  await beginCarriage({ damping: 1500, fixed: 0.15, sliding: 0.12 });
  await page.getByRole("button", { name: "all fields of Body" }).click();
  await page.getByLabel("Title").fill("Iron ways");
  await page.getByRole("button", { name: "Back to the sentence" }).click();
  await change(page, "Length of the run", `${length} s`);
  await choose(page, "End of the run", "to the end");
  await expectText(answerOf(page)).toBe(`The carriage sticks and slips, ${(1 / period).toFixed(0)} times a second.`);
  await expectText(savingOf(page)).toMatch(/^saved \d\d:\d\d$/);
  await page.getByRole("link", { name: "Ways" }).click();
  await page.getByRole("button", { name: "More for Iron ways" }).click();
  await page.getByRole("button", { name: "Duplicate" }).click();
  await openScenario(page, "Iron ways, copy");
  await change(page, "Kinetic friction", "0.06");
  await change(page, "Static friction", "0.06");
  // Friction that does not fall when it moves lets it slide at the drive's speed, Fk/k behind; iron goes on in jumps.
  await expectText(answerOf(page)).toBe("The carriage slides smoothly at 2 mm/s.");
  await page.getByRole("button", { name: "overlay a scenario" }).click();
  await page.getByRole("combobox", { name: "Scenario to overlay" }).selectOption({ label: "Iron ways" });
  await page.getByRole("slider", { name: "Time cursor" }).press("End");
  await expectLength(page, "behind drive").toBeCloseTo((-0.06 * pressing) / 4e6, 8);
  await expectLength(page, "carriage").toBeCloseTo(2e-3 * length - (0.06 * pressing) / 4e6, 5);
  const beside = page.locator('dt:text-is("Iron ways") + dd');
  await expectText(beside.first()).toBe(`${(70 * slipDistance * 1e3).toPrecision(4)}mm`);
  await expectText(beside.last()).toBe("0mm/s");
});

/** Ada at a project with nothing in it yet, in a browser of her own. */
async function arrive(project: string): Promise<void> {
  await createProject(ada, project);
  page = await journey.visit();
  await signIn(page, emailOf("Ada"));
  await page.getByRole("link", { name: project }).click();
}

/** 120 kg pressed by their weight and 800 N; standard gravity. */
const pressing = 120 * 9.80665 + 800;

async function beginFrom(title: string): Promise<void> {
  await page.getByRole("main").getByRole("button", { name: "New scenario" }).click();
  const choices = page.getByRole("list", { name: "Starting points" }).getByRole("listitem");
  await choices.filter({ hasText: title }).getByRole("button").click();
  await answerOf(page).waitFor();
}

/** A carriage on a feed drive from plain numbers, everything by its visible label. */
async function beginCarriage(way: { damping: number; fixed: number; sliding: number }): Promise<void> {
  await beginScenario(page);
  await change(page, "Mass", "120 kg");
  await change(page, "Stiffness", "4 N/µm");
  await change(page, "Damping", `${way.damping} N·s/m`);
  await change(page, "Kinetic friction", "0");
  await change(page, "Static friction", String(way.fixed));
  await change(page, "Kinetic friction", String(way.sliding));
  await choose(page, "Weight on the faces", "its weight");
  await change(page, "Preload per face", "800");
  await change(page, "Rate", "2 mm/s");
}

/** What the force loop says of how far the body goes to each side, from the drive. */
async function expectReach(reach: number): Promise<void> {
  const loop = page.getByRole("img", { name: /^Force against displacement/ });
  const text = `from the drive from ${millimetres(-reach)} to ${millimetres(reach)};`;
  await expect.poll(async () => plain(await loop.getAttribute("aria-label")), { timeout: 15_000 }).toContain(text);
}

/** What the spectrum says of the swing at the drive's own rate. */
async function expectFirstOrder(amplitude: number): Promise<void> {
  const spectrum = page.getByRole("img", { name: /^Spectrum of the displacement/ });
  const text = `Peaks, highest first: 5 Hz, order 1, ${millimetres(amplitude)}`;
  await expect.poll(async () => plain(await spectrum.getAttribute("aria-label")), { timeout: 15_000 }).toContain(text);
}

/** To three digits, as the page says it. */
const millimetres = (metres: number): string => `${Number((metres * 1e3).toPrecision(3))} mm`.replace("-", "\u2212");

const plain = (text: string | null): string => (text ?? "").replace(/\s/g, " ");

const strip = () => page.getByTitle("Press to move the cursor, drag to see a span");

/** The end of the run as it is shown, s. */
const lengthShown = async (): Promise<number> => Number(await page.getByLabel("Seen to").inputValue());

/** From one share of the strip to another. */
async function seeByDragging(from: number, to: number): Promise<void> {
  await strip().scrollIntoViewIfNeeded();
  const box = (await strip().boundingBox())!;
  await page.mouse.move(box.x + from * box.width, box.y + 20);
  await page.mouse.down();
  await page.mouse.move(box.x + to * box.width, box.y + 20, { steps: 4 });
  await page.mouse.up();
  await expectText(page.getByText(/^Force against displacement,/)).toContain("the part seen above");
}

async function pressStrip(share: number): Promise<void> {
  const box = (await strip().boundingBox())!;
  await page.mouse.click(box.x + share * box.width, box.y + 20);
}
