import type { Page } from "playwright-core";
import { afterAll, afterEach, beforeAll, expect, it } from "vitest";
import { Journey } from "../support/journey.ts";
import { createProject, createScenario, emailOf, signUp } from "../support/people.ts";
import { releasedBody } from "../support/released-body.ts";
import { signIn } from "../support/steps.ts";

let journey: Journey;
beforeAll(async () => {
  journey = await Journey.open();
});
afterAll(() => journey.close());
afterEach(() => expect(journey.complaints.splice(0)).toEqual([]));

it("draws the curves in the colours of the look, also for those who want no motion", async () => {
  const ada = await signUp(journey.server, "Ada");
  const projectId = await createProject(ada);
  const { id } = await createScenario(ada, projectId, releasedBody(0.05));
  for (const reducedMotion of ["no-preference", "reduce"] as const) {
    const page = await journey.visit({ reducedMotion });
    await signIn(page, emailOf("Ada"));
    await page.goto(`/projects/${projectId}/scenarios/${id}`);
    // The tokens of the light look: slip, and stick.
    await expect.poll(() => strokes(page), { timeout: 15_000 }).toEqual(expect.arrayContaining([slip, stick]));
  }
});

const slip = "rgb(15, 107, 107)";
const stick = "rgb(168, 72, 27)";

const strokes = (page: Page): Promise<string[]> =>
  page.locator(".js-plotly-plot .js-line").evaluateAll((lines) => lines.map((line) => getComputedStyle(line).stroke));
