import { execFileSync } from "node:child_process";
import type { Page } from "playwright-core";
import { afterAll, afterEach, beforeAll, expect, it } from "vitest";
import type { RevisionSummary } from "../../api/src/contract.ts";
import { axeFindings } from "../support/axe.ts";
import { Journey } from "../support/journey.ts";
import { addMember, createProject, createScenario, emailOf, password, signUp } from "../support/people.ts";
import { answerOf, change, expectText, savingOf, signIn, valueOf } from "../support/steps.ts";

let journey: Journey;
beforeAll(async () => {
  journey = await Journey.open();
});
afterAll(() => journey.close());
afterEach(() => expect(journey.complaints.splice(0)).toEqual([]));

/** A carriage that sticks and slips at the feed it is asked for; a damper cures it. */
const creepFeed = {
  format: "restband-scenario/1",
  title: "Z carriage, creep feed",
  purpose: "feed",
  motion: "linear",
  body: { inertia: 120, stiffness: 4e6, viscous: 350 },
  contact: {
    law: { model: "coulomb", static: 0.15, kinetic: 0.12 },
    normal: { preload: 800, weight: true },
  },
  base: [{ kind: "ramp", rate: 0.002 }],
  span: { seconds: 0.5, untilRest: false },
  limits: [{ quantity: "stickFraction", max: 0 }],
};

/** Once the answer stands there and is saved. */
const freeze = async (page: Page, answer: RegExp): Promise<void> => {
  await expectText(answerOf(page)).toMatch(answer);
  await expectText(savingOf(page)).toMatch(/^saved/);
  await page.getByRole("button", { name: "Freeze a revision" }).click();
  await page.getByRole("button", { name: "Freeze it" }).click();
  await page.getByRole("heading", { name: "Comments", level: 2 }).waitFor();
};

const ask = async (page: Page, reviewer: string, words: string): Promise<void> => {
  await page.getByRole("button", { name: "Ask for a review" }).click();
  const dialog = page.getByRole("dialog", { name: "Ask for a review" });
  await dialog.getByRole("checkbox", { name: reviewer }).check();
  await dialog.getByLabel("What to look at").fill(words);
  await dialog.getByRole("button", { name: "Ask for a review" }).click();
  await dialog.waitFor({ state: "detached" });
};

/** By what waits, from all projects. */
async function openWaiting(page: Page, words: string): Promise<void> {
  await page.goto("/projects");
  const waiting = page.getByRole("region", { name: "Waits for you" }).getByRole("listitem");
  await waiting.filter({ hasText: words }).getByRole("link").click();
  await page.getByRole("heading", { name: "Comments", level: 2 }).waitFor();
}

const replays = (page: Page) => page.getByRole("list", { name: "Replays" }).getByRole("listitem");

/** By the same method, by the other one, and by the Python file, whose print is brought back. */
async function replayAllWays(page: Page): Promise<void> {
  await page.getByRole("button", { name: "Replay it here" }).click();
  await expect.poll(() => replays(page).count(), { timeout: 30_000 }).toBe(2);
  const saving = page.waitForEvent("download");
  await page.getByRole("button", { name: "Save the Python file" }).click();
  const file = await (await saving).path();
  const printed = execFileSync("python3", [file], { encoding: "utf8" });
  await page.getByRole("button", { name: "Bring back what it printed" }).click();
  await page.getByLabel("What the file printed, from its first line to its last").fill(printed);
  await page.getByRole("button", { name: "Keep it as a replay" }).click();
  await expect.poll(() => replays(page).count(), { timeout: 15_000 }).toBe(3);
  for (const replay of await replays(page).all()) await expectText(replay).toContain("agrees");
}

async function decide(page: Page, button: string, reasons: string): Promise<void> {
  await page.getByLabel("Reasons, kept with the revision").fill(reasons);
  await page.getByLabel("Your password, once more").fill(password);
  await page.getByRole("button", { name: button }).click();
  await page.getByRole("list", { name: "Decisions" }).waitFor();
}

it("takes a scenario from its first revision, returned, to an accepted one, and shows what was altered behind it", async () => {
  const people = ["Olga", "Dora", "Rob"];
  const [olga, dora] = await Promise.all(people.map((name) => signUp(journey.server, name)));
  const projectId = await createProject(olga);
  await addMember(olga, projectId, emailOf("Dora"), "editor");
  await addMember(olga, projectId, emailOf("Rob"), "reviewer");
  const { id: scenarioId } = await createScenario(dora, projectId, creepFeed);
  const [owner, designer, reviewer] = await Promise.all(people.map(() => journey.visit()));
  await Promise.all([owner, designer, reviewer].map((page, i) => signIn(page, emailOf(people[i]))));
  const atScenario = `/projects/${projectId}/scenarios/${scenarioId}`;

  // Dora freezes what she has and asks Rob. She cannot decide on it herself.
  await designer.goto(atScenario);
  await valueOf(designer, "Mass").waitFor();
  await freeze(designer, /sticks and slips/);
  await ask(designer, "Rob", "Does it hold at 2 mm/s?");
  await expectText(designer.getByRole("region", { name: "Review" })).toContain("You asked Rob");
  expect(await designer.getByRole("button", { name: "Accept revision 1" }).count()).toBe(0);

  // Rob finds it, replays it all three ways, pins a comment and returns it.
  await openWaiting(reviewer, "Dora asks you to review revision 1");
  await replayAllWays(reviewer);
  const axis = reviewer.locator("[data-axis]");
  await axis.scrollIntoViewIfNeeded();
  await axis.click({ position: { x: 130, y: 60 } });
  const form = reviewer.getByRole("form", { name: "New comment" });
  expect(Number(await form.getByLabel("At").inputValue())).toBeGreaterThan(0.03);
  await form.getByLabel("At").fill("0.068");
  await form.getByLabel("Comment", { exact: true }).fill("It stands still here after the first jump. @Dora");
  await form.getByRole("button", { name: "Keep the comment" }).click();
  const comments = reviewer.getByRole("list", { name: "Comments" }).getByRole("listitem");
  await expectText(comments.first()).toContain("1 · Rob at 0.068 s");
  expect(await axeFindings(reviewer)).toEqual([]);
  await decide(reviewer, "Return to Dora", "It sticks 40 % of the time at the feed that is asked for.");

  // Dora reads it, answers, settles, puts a damper in and freezes anew.
  await openWaiting(designer, "Rob returned revision 1");
  await expectText(designer.getByRole("list", { name: "Decisions" })).toContain("returned by Rob");
  await designer.getByRole("button", { name: "Reply" }).click();
  await designer.getByRole("textbox", { name: "Reply" }).fill("The damper OD-4 goes in.");
  await designer.getByRole("button", { name: "Keep the reply" }).click();
  await designer.getByRole("button", { name: "Settle" }).click();
  await expectText(designer.getByRole("list", { name: "Comments" })).toContain("settled");
  await designer.goto(atScenario);
  await change(designer, "Damping", "4100 N·s/m");
  await freeze(designer, /slides smoothly/);
  await ask(designer, "Rob", "Now with the damper.");

  // Rob compares the two, replays and accepts.
  await openWaiting(reviewer, "Dora asks you to review revision 2");
  await replayAllWays(reviewer);
  const [second, first] = await dora.get<RevisionSummary[]>("listRevisions", { params: { projectId } });
  await reviewer.goto(`/projects/${projectId}/compare?a=revision:${first.id}&b=revision:${second.id}`);
  await expectText(reviewer.getByRole("main")).toContain("Damping");
  await openWaiting(reviewer, "Dora asks you to review revision 2");
  await decide(reviewer, "Accept revision 2", "The replays agree, it slides, and the limit is kept.");
  await expectText(reviewer.getByRole("list", { name: "Decisions" })).toContain("accepted by Rob");

  // It is marked where Olga sees it; the trail tells all of it and is whole.
  await owner.goto(atScenario);
  await expectText(owner.getByRole("list", { name: "Revisions" })).toMatch(
    /Revision 2\s*accepted.*Revision 1\s*returned/,
  );
  await owner.goto(`/projects/${projectId}`);
  const seal = owner.getByRole("group", { name: "State of the trail" });
  await expectText(seal).toContain("The trail is whole.");
  await owner.getByRole("button", { name: "The whole trail" }).click();
  await owner.getByLabel("About").selectOption({ label: "revisions" });
  const trail = owner.getByRole("region", { name: "Trail" });
  await expectText(trail).toContain("Rob accepted revision 2 of Z carriage, creep feed.");
  await expectText(trail).not.toContain("commented");

  // Somebody alters the accepted revision behind the product's back.
  await journey.alter((database) => database("revisions").where({ id: second.id }).update({ title: "Another" }));
  await owner.goto(`/projects/${projectId}/revisions/${second.id}`);
  await expectText(owner.getByRole("alert")).toContain("This revision is not as it was frozen. Do not rely on it.");
  await owner.goto(`/projects/${projectId}`);
  await expectText(seal).toMatch(/damaged at one place\.\s*revisions, row/);
  const ready = await fetch(`${journey.server.address}/ready?deep`);
  expect(ready.status).toBe(503);
  expect(await ready.json()).toMatchObject({
    ready: false,
    chain: { isWhole: false, faults: [{ projectId, table: "revisions", id: second.id }] },
  });
});
