import { afterAll, afterEach, beforeAll, expect, it } from "vitest";
import { focused, tabTo } from "../support/hands.ts";
import { Journey } from "../support/journey.ts";
import { createProject, createScenario, emailOf, password, signUp } from "../support/people.ts";
import { releasedBody, restOf } from "../support/released-body.ts";
import { answerOf, expectText, savingOf, valueOf } from "../support/steps.ts";

let journey: Journey;
beforeAll(async () => {
  journey = await Journey.open();
});
afterAll(() => journey.close());
afterEach(() => expect(journey.complaints.splice(0)).toEqual([]));

it("goes from signing in to a changed value, kept, without a mouse", async () => {
  const ada = await signUp(journey.server, "Ada");
  const projectId = await createProject(ada, "Hall 3");
  await createScenario(ada, projectId, releasedBody(0.02));
  const page = await journey.visit();
  await page.goto("/");
  await page.getByLabel("E-mail").waitFor();
  await tabTo(page, (name) => name === "E-mail");
  await page.keyboard.type(emailOf("Ada"));
  await tabTo(page, (name) => name === "Password");
  await page.keyboard.type(password);
  await page.keyboard.press("Enter");
  await page.getByRole("link", { name: "Hall 3" }).waitFor();
  await tabTo(page, (name) => name === "Hall 3");
  await page.keyboard.press("Enter");
  await page.getByRole("heading", { name: "Slide, released" }).waitFor();
  await tabTo(page, (name) => name === "Slide, released");
  await page.keyboard.press("Enter");
  await expectText(answerOf(page)).toBe(restOf(0.02));
  await tabTo(page, (name) => name === "Starting displacement: 20 mm");
  await page.keyboard.press("Enter");
  await page.keyboard.type("2");
  await page.keyboard.press("Enter");
  // At 2 mm the spring pulls with 1.6 N, and friction holds up to 2 N.
  await expectText(answerOf(page)).toBe("The body never moves; it uses 80 % of its static friction.");
  expect(await focused(page)).toBe("Starting displacement: 2 mm");
  await page.keyboard.press("Enter");
  await page.keyboard.press("ArrowUp");
  await expectText(valueOf(page, "Starting displacement")).toBe("2.02");
  await page.keyboard.press("Escape");
  await expectText(valueOf(page, "Starting displacement")).toBe("2");
  await page.keyboard.press("Control+z");
  await expectText(valueOf(page, "Starting displacement")).toBe("20");
  await page.keyboard.press("Control+Shift+KeyZ");
  await expectText(valueOf(page, "Starting displacement")).toBe("2");
  await expectText(savingOf(page)).toMatch(/^saved \d\d:\d\d$/);
});
