import type { Page } from "playwright-core";
import { afterAll, afterEach, beforeAll, describe, expect, it } from "vitest";
import { feedCycle } from "../support/feed-cycle.ts";
import { keyboard, mouse, type Hands } from "../support/hands.ts";
import { Journey } from "../support/journey.ts";
import { createProject, emailOf, password, signUp } from "../support/people.ts";
import { answerOf, expectEvents, expectText, near, savingOf } from "../support/steps.ts";

let journey: Journey;
beforeAll(async () => {
  journey = await Journey.open();
});
afterAll(() => journey.close());
afterEach(() => expect(journey.complaints.splice(0)).toEqual([]));

/** m/s² in standard gravity: by definition. */
const gravity = 9.80665;

/**
 * A slide of 450 kg lies on its ways with its weight alone, friction 0.2 and 0.14, and is fed at 2 mm/min through 60 N/μm
 * and 9000 N·s/m. What it does is the closed form of `feedCycle`: textbook stick-slip, damping kept.
 */
const slide = feedCycle({
  mass: 450,
  stiffness: 60e6,
  damping: 9000,
  holding: 0.2 * 450 * gravity,
  sliding: 0.14 * 450 * gravity,
  feed: 2e-3 / 60,
});
const period = slide.slipTime + slide.stickTime;

/**
 * Two pads press 900 N each at 110 mm on a rotor of 1.8 kg·m² at 1200 turns a minute, friction 0.4 while it slides: a
 * constant torque, hence ω/α until it stands and ω²/2α on the way (uniform deceleration, by definition).
 */
const speed = (1200 / 60) * 2 * Math.PI;
const slowing = (0.4 * 2 * 900 * 0.11) / 1.8;
const standsAfter = speed / slowing;
const standsAt = speed ** 2 / (2 * slowing);

const people: readonly [string, Hands][] = [
  ["mouse", mouse],
  ["keyboard", keyboard],
];

describe.each(people)("a newcomer, by %s alone,", (name, hands) => {
  it("learns whether a carriage sticks at 2 mm/min", async () => {
    const page = await openProject(`Slide ${name}`, hands);
    await beginWith(page, hands, "Machine slide on a feed drive");
    await hands.change(page, "Mass", "450");
    await hands.change(page, "Stiffness", "60 N/µm");
    await hands.change(page, "Damping", "9000");
    await hands.change(page, "Static friction", "0,2");
    await hands.change(page, "Kinetic friction", "0.14");
    await hands.change(page, "Rate", "2 mm/min");
    await hands.change(page, "Length of the run", "4 s");

    const often = Number((1 / period).toPrecision(3));
    await expectText(answerOf(page)).toBe(`The carriage sticks and slips, ${often} times a second.`);
    const share = Number(((100 * slide.stickTime) / period).toPrecision(2));
    const jump = Number((slide.slipDistance * 1e6).toPrecision(3));
    await expectText(page.getByRole("main")).toContain(
      `It stands still ${share} % of the time, then slips ${jump} μm at up to`,
    );
    await expectText(limit(page, "Share of time stuck")).toContain("broken as entered");
    await expectEvents(page, 4).toMatchObject([
      { event: "starts", time: 0 },
      { event: "breaks away", time: near(slide.firstBreakAway, 5) },
      { event: "stops", time: near(slide.firstBreakAway + slide.slipTime, 5) },
      { event: "breaks away", time: near(slide.firstBreakAway + period, 5) },
    ]);
    await expectText(savingOf(page)).toMatch(/^saved \d\d:\d\d$/);
  });

  it("learns where a pad-braked rotor comes to rest", async () => {
    const page = await openProject(`Rotor ${name}`, hands);
    await beginWith(page, hands, "Pad-braked rotor");
    await hands.change(page, "Moment of inertia", "1.8");
    await hands.change(page, "Kinetic friction", "0.4");
    await hands.change(page, "Preload per face", "900 N");
    await hands.change(page, "Effective radius", "110 mm");
    await hands.change(page, "Starting velocity", "1200 rpm");

    await expectText(answerOf(page)).toBe(
      `The rotor comes to rest after ${standsAfter.toFixed(2)} s, at ${standsAt.toFixed(0)} rad.`,
    );
    await expectText(page.getByRole("main")).toContain(
      `That is ${standsAt.toFixed(0)} rad, ${Number((standsAt / (2 * Math.PI)).toPrecision(3))} turns from where it began.`,
    );
    await expectText(limit(page, "Time to rest")).toContain(`kept over the whole range · ${standsAfter.toFixed(2)} s`);
    await expectEvents(page, 2).toMatchObject([
      { event: "starts" },
      { event: "stops", time: near(standsAfter, 5), position: near(standsAt, 3) },
    ]);
    await expectText(page.getByRole("main")).toContain("must never be the only thing that holds");
    await expectText(savingOf(page)).toMatch(/^saved \d\d:\d\d$/);
  });
});

/** Signed in, on the home of a project of one's own. */
async function openProject(name: string, hands: Hands): Promise<Page> {
  const who = name.replace(" ", "-");
  const own = await signUp(journey.server, who);
  await createProject(own, name);
  const page = await journey.visit();
  await page.goto("/");
  await page.getByLabel("E-mail").waitFor();
  await hands.type(page, "E-mail", emailOf(who));
  await hands.type(page, "Password", password);
  await page.keyboard.press("Enter");
  await page.getByRole("link", { name }).waitFor();
  await hands.press(page, name);
  return page;
}

async function beginWith(page: Page, hands: Hands, name: string): Promise<void> {
  await page.getByRole("main").getByRole("button", { name: "New scenario" }).waitFor();
  await hands.press(page, "New scenario");
  await page.getByRole("list", { name: "Starting points" }).waitFor();
  await hands.press(page, `Begin with: ${name}`);
  await answerOf(page).waitFor();
  await page.getByRole("heading", { name: "Statement" }).waitFor();
}

const limit = (page: Page, quantity: string) =>
  page.getByRole("list", { name: "Limits", exact: true }).getByRole("listitem").filter({ hasText: quantity });
