import type { Page } from "playwright-core";
import { afterAll, afterEach, beforeAll, expect, it } from "vitest";
import { demoPeople } from "../../api/src/demo/demo-people.ts";
import { seedDemo } from "../../api/src/demo/seed-demo.ts";
import { feedCycle } from "../support/feed-cycle.ts";
import { Journey, phone } from "../support/journey.ts";
import { password } from "../support/people.ts";
import {
  answerOf,
  change,
  expectEvents,
  expectLength,
  expectText,
  near,
  openScenario,
  signIn,
  textOf,
  valueOf,
} from "../support/steps.ts";

let journey: Journey;
beforeAll(async () => {
  journey = await Journey.open();
  await seedDemo(journey.server.database, password);
});
afterAll(() => journey.close());
afterEach(() => expect(journey.complaints.splice(0)).toEqual([]));

/** The demo's creep feed: 120 kg pressed by their weight and 800 N, friction 0.15 and 0.12. */
const pressing = 120 * 9.80665 + 800;
const carriage = { mass: 120, stiffness: 4e6, damping: 350, holding: 0.15 * pressing, sliding: 0.12 * pressing };

it("reads, steps through and changes a scenario with a finger", async () => {
  const page = await journey.visitByPhone();
  await signIn(page, demoPeople.ines.email);
  await page.getByRole("link", { name: "Hall 3 refit" }).tap();
  await openScenario(page, "Z carriage, creep feed");
  const slow = feedCycle({ ...carriage, feed: 0.002 });
  await seeFrequency(page, slow);
  await page.locator(".js-plotly-plot").last().waitFor();
  await expectNoSidewaysScroll(page);
  await stepThroughEvents(page, slow);
  await change(page, "Rate", "1");
  const slower = feedCycle({ ...carriage, feed: 0.001 });
  await seeFrequency(page, slower);
  await expectEvents(page, 2).toMatchObject([
    { event: "starts" },
    { event: "breaks away", time: near(slower.firstBreakAway, 6) },
  ]);
  await expectText(page.getByText(/^saved \d\d:\d\d$/)).toMatch(/^saved/);
  await page.reload();
  await expectText(valueOf(page, "Rate")).toBe("1");
  await seeFrequency(page, slower);
});

async function seeFrequency(page: Page, { slipTime, stickTime }: ReturnType<typeof feedCycle>): Promise<void> {
  const hz = (1 / (slipTime + stickTime)).toFixed(0);
  await expectText(answerOf(page)).toBe(`The carriage sticks and slips, ${hz} times a second.`);
}

/** The docked strip is the cursor: its buttons go from event to event, and the figures above the plots follow. */
async function stepThroughEvents(page: Page, cycle: ReturnType<typeof feedCycle>): Promise<void> {
  const before = page.getByRole("button", { name: "Event before" });
  const next = page.getByRole("button", { name: "Next event" });
  while (!(await textOf(page.getByText(/^Cursor at/))).startsWith("Cursor at 0s")) await before.tap();
  await next.tap();
  await expectText(page.getByText(/^Cursor at/)).toBe(
    `Cursor at ${(cycle.firstBreakAway * 1e3).toFixed(2)}ms, slipping forward`,
  );
  await next.tap();
  await expectLength(page, "carriage").toBeCloseTo(cycle.slipDistance, 8);
  await expectText(page.getByText(/^Cursor at/)).toMatch(/stuck$/);
}

/** Nothing is wider than the screen but what scrolls within itself: a page that is would be zoomed out to fit. */
async function expectNoSidewaysScroll(page: Page): Promise<void> {
  const width = await page.evaluate(() => Math.max(window.innerWidth, document.documentElement.scrollWidth));
  expect(width).toBe(phone.width);
}
