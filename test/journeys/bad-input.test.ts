import { afterAll, afterEach, beforeAll, expect, it } from "vitest";
import { Journey } from "../support/journey.ts";
import { createProject, createScenario, emailOf, signUp } from "../support/people.ts";
import { releasedBody, restOf } from "../support/released-body.ts";
import { answerOf, editorOf, expectText, savingOf, signIn, valueOf } from "../support/steps.ts";

let journey: Journey;
beforeAll(async () => {
  journey = await Journey.open();
  await signUp(journey.server, "Ada");
});
afterAll(() => journey.close());
afterEach(() => expect(journey.complaints.splice(0)).toEqual([]));

it("keeps a refused value as typed, names the field, and stays with the last valid answer", async () => {
  const ada = await signUp(journey.server, "Bo");
  const projectId = await createProject(ada);
  const { id } = await createScenario(ada, projectId, releasedBody(0.05));
  const page = await journey.visit();
  await signIn(page, emailOf("Bo"));
  await page.goto(`/projects/${projectId}/scenarios/${id}`);
  await valueOf(page, "Kinetic friction").click();
  const editor = editorOf(page, "Kinetic friction");
  const field = editor.getByRole("textbox", { name: "Kinetic friction", exact: true });

  await field.fill("0.3");
  await expectText(editor).toContain("Static friction");
  await expectText(editor).toContain("Until then the answer keeps 0.15.");
  expect(await field.getAttribute("aria-invalid")).toBe("true");
  await expectText(savingOf(page)).toMatch(/, 1 field to put right$/);
  await expectText(answerOf(page)).toBe(restOf(0.05));

  await editor.getByRole("button", { name: "Done" }).click();
  expect(await field.inputValue()).toBe("0.3");
  await page.reload();
  await expectText(valueOf(page, "Kinetic friction")).toBe("0.3");
  await expectText(savingOf(page)).toMatch(/, 1 field to put right$/);
  await expectText(answerOf(page)).toBe(restOf(0.05));
});

it("says one neutral sentence to a wrong password and to an unknown address, and keeps both as typed", async () => {
  const page = await journey.visit();
  for (const email of [emailOf("Ada"), emailOf("Nobody")]) {
    await page.goto("/sign-in");
    await page.getByLabel("E-mail").fill(email);
    await page.getByLabel("Password", { exact: true }).fill("not her password");
    await page.getByRole("button", { name: "Sign in" }).click();
    await page.getByText("Address and password do not belong together.").waitFor();
    expect(await page.getByLabel("E-mail").inputValue()).toBe(email);
    expect(await page.getByLabel("Password", { exact: true }).inputValue()).toBe("not her password");
  }
  // Chromium tells of every answer that is no success.
  expect(journey.takeComplaints(/status of 401 .*\/api\/sessions?$/)).toHaveLength(2);
});

it("says of an unknown address, and of somebody else's project, that nothing is there", async () => {
  const bo = await signUp(journey.server, "Cleo");
  const projectId = await createProject(bo);
  const page = await journey.visit();
  await signIn(page, emailOf("Ada"));
  for (const path of ["/no/such/page", `/projects/${projectId}`]) {
    await page.goto(path);
    await page.getByRole("heading", { name: "There is nothing at this address" }).waitFor();
  }
  expect(journey.takeComplaints(/status of 404|There is nothing at this address/).length).toBeGreaterThan(0);
});
