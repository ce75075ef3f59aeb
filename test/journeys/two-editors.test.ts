import type { Page } from "playwright-core";
import { afterAll, afterEach, beforeAll, expect, it } from "vitest";
import { axeFindings } from "../support/axe.ts";
import { Journey } from "../support/journey.ts";
import { addMember, createProject, createScenario, emailOf, signUp } from "../support/people.ts";
import { change, expectText, savingOf, signIn, valueOf } from "../support/steps.ts";

let journey: Journey;
beforeAll(async () => {
  journey = await Journey.open();
});
afterAll(() => journey.close());
afterEach(() => expect(journey.complaints.splice(0)).toEqual([]));

it("asks what stands where two people have changed one scenario, and loses neither's work", async () => {
  const ada = await signUp(journey.server, "Ada");
  const bo = await signUp(journey.server, "Bo");
  const projectId = await createProject(ada);
  await addMember(ada, projectId, bo.email, "editor");
  const { id } = await createScenario(ada, projectId);
  const [first, second] = [await journey.visit(), await journey.visit()];
  for (const [page, name] of [
    [first, "Ada"],
    [second, "Bo"],
  ] as const) {
    await signIn(page, emailOf(name));
    await page.goto(`/projects/${projectId}/scenarios/${id}`);
    await valueOf(page, "Mass").waitFor();
  }
  await change(first, "Mass", "3 kg");
  await expectText(savingOf(first)).toMatch(/^saved \d\d:\d\d$/);
  await change(second, "Length of the run", "7 s");

  const dialog = second.getByRole("dialog", { name: "Two versions of this scenario" });
  await expectText(dialog).toContain("Ada saved version 2");
  await expectText(dialog.getByRole("group", { name: "Mass" })).toBe("Massyours 2 kgAda 3 kg");
  await expectText(dialog.getByRole("group", { name: "Length of the run" })).toBe("Length of the runyours 7 sAda 5 s");
  expect(await axeFindings(second)).toEqual([]);
  // What only one of them has changed is chosen already.
  expect(await dialog.getByRole("radio", { name: "Ada 3 kg" }).isChecked()).toBe(true);
  expect(await dialog.getByRole("radio", { name: "yours 7 s" }).isChecked()).toBe(true);
  await dialog.getByRole("button", { name: "Save this" }).click();
  await seeBoth(second);
  await expectText(savingOf(second)).toMatch(/^saved \d\d:\d\d$/);
  await first.reload();
  await seeBoth(first);
  expect(journey.takeComplaints(/status of 409/)).toHaveLength(1);
});

async function seeBoth(page: Page): Promise<void> {
  await expectText(valueOf(page, "Mass")).toBe("3");
  await expectText(valueOf(page, "Length of the run")).toBe("7");
}
