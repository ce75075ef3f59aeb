import { afterAll, afterEach, beforeAll, expect, it } from "vitest";
import { Journey } from "../support/journey.ts";
import { createProject, createScenario, emailOf, signUp } from "../support/people.ts";
import { releasedBody, restOf } from "../support/released-body.ts";
import { answerOf, change, expectText, savingOf, signIn, valueOf } from "../support/steps.ts";

let journey: Journey;
beforeAll(async () => {
  journey = await Journey.open();
});
afterAll(() => journey.close());
afterEach(() => expect(journey.complaints.splice(0)).toEqual([]));

it("answers on while the server is gone, keeps what is typed, and saves it when the server is back", async () => {
  const ada = await signUp(journey.server, "Ada");
  const projectId = await createProject(ada);
  const { id } = await createScenario(ada, projectId, releasedBody(0.05));
  const page = await journey.visit();
  await signIn(page, emailOf("Ada"));
  await page.goto(`/projects/${projectId}/scenarios/${id}`);
  await expectText(answerOf(page)).toBe(restOf(0.05));

  await journey.stopServer();
  await change(page, "Starting displacement", "20 mm");
  await expectText(answerOf(page)).toBe(restOf(0.02));
  await expectText(savingOf(page)).toMatch(/^not saved since \d\d:\d\d, trying again$/);
  await page.getByText(/^No answer from the server since \d\d:\d\d\. Trying again; what you typed stays\.$/).waitFor();

  await journey.startServer();
  await expectText(savingOf(page)).toMatch(/^saved \d\d:\d\d$/);
  await page.reload();
  await expectText(valueOf(page, "Starting displacement")).toBe("20");
  await expectText(answerOf(page)).toBe(restOf(0.02));
  expect(journey.takeComplaints(/net::ERR_/).length).toBeGreaterThan(0);
});
