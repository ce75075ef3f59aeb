import type { BrowserContextOptions, Page } from "playwright-core";
import { afterAll, afterEach, beforeAll, describe, expect, it } from "vitest";
import { demoPeople } from "../../api/src/demo/demo-people.ts";
import { seedDemo } from "../../api/src/demo/seed-demo.ts";
import { axeFindings } from "../support/axe.ts";
import { Journey, phone } from "../support/journey.ts";
import { password } from "../support/people.ts";
import { answerOf, editorOf, expectText, openScenario, signIn, valueOf } from "../support/steps.ts";

let journey: Journey;
beforeAll(async () => {
  journey = await Journey.open();
  await seedDemo(journey.server.database, password);
});
afterAll(() => journey.close());
afterEach(() => expect(journey.complaints.splice(0)).toEqual([]));

const looks: [string, BrowserContextOptions][] = [
  ["light", { colorScheme: "light" }],
  ["dark", { colorScheme: "dark" }],
  ["narrow", { viewport: phone, hasTouch: true, isMobile: true }],
];

describe.each(looks)("axe finds nothing, %s,", (_, options) => {
  it.each([
    ["/sign-in", "Sign in"],
    ["/sign-up", "Make an account"],
    ["/welcome/not-a-token", "Open"],
    ["/licences", "What others made that is in here."],
    ["/no/such/page", "There is nothing at this address"],
  ])("on %s", async (path, heading) => {
    const page = await journey.visit(options);
    await page.goto(path);
    await page.getByRole("heading", { level: 1, name: heading }).waitFor();
    expect(await axeFindings(page)).toEqual([]);
  });

  it("on the projects, a project and its dialogs", async () => {
    const page = await journey.visit(options);
    await signIn(page, demoPeople.ines.email);
    expect(await axeFindings(page)).toEqual([]);
    await page.keyboard.press("n");
    await inDialog(page, "New project", "What it is about");
    await page.getByRole("link", { name: "Hall 3 refit" }).click();
    await page.getByRole("heading", { level: 1, name: /^Six scenarios. .* limits/ }).waitFor();
    expect(await axeFindings(page)).toEqual([]);
    await page.getByRole("button", { name: "Change name and description" }).click();
    await inDialog(page, "Change the project", "What it is about");
    await page.getByRole("button", { name: "Add someone" }).click();
    await inDialog(page, "Add someone", "They need an account first.");
    await page.getByRole("button", { name: "Remove Aoife Kerr" }).click();
    await inDialog(page, "Remove Aoife Kerr", "They no longer see anything");
    await page.keyboard.press("?");
    await inDialog(page, "Keyboard", "Use single keys");
  });

  it("on what a scenario can begin from", async () => {
    const page = await journey.visit(options);
    await signIn(page, demoPeople.ines.email);
    await page.getByRole("link", { name: "Hall 3 refit" }).click();
    await page.getByRole("heading", { level: 1, name: /^Six scenarios/ }).waitFor();
    await page.keyboard.press("n");
    await page.getByRole("heading", { level: 1, name: "Begin with a case like yours." }).waitFor();
    await page
      .getByRole("img", { name: /^Motion over/ })
      .last()
      .waitFor();
    expect(await axeFindings(page)).toEqual([]);
  });

  it("on the table of cases", async () => {
    const page = await journey.visit(options);
    await signIn(page, demoPeople.ines.email);
    await page.getByRole("link", { name: "Hall 3 refit" }).click();
    await page.getByRole("heading", { level: 1, name: /^Six scenarios/ }).waitFor();
    await page.goto(`${page.url()}/cases`);
    await page.getByRole("heading", { level: 1, name: "A row per case, a column per number." }).waitFor();
    expect(await axeFindings(page)).toEqual([]);
  });

  it("on what is asked of a scenario next", async () => {
    const page = await journey.visit(options);
    await signIn(page, demoPeople.ines.email);
    await page.getByRole("link", { name: "Hall 3 refit" }).click();
    await openScenario(page, "Z carriage, creep feed");
    await page.waitForURL(/scenarios\/[0-9a-f-]{36}$/);
    await page.goto(`${page.url()}/explore`);
    const tolerance = page.getByRole("region", { name: "Tolerance" });
    await tolerance.getByRole("button", { name: "Let two of them go together" }).click();
    await tolerance.getByRole("button", { name: "Let values scatter by a covariance" }).click();
    await tolerance.getByLabel(/^Correlation of/).fill("2");
    await tolerance.getByText("Between −1 and 1.").waitFor();
    await page.getByRole("region", { name: "Room around each value" }).waitFor();
    expect(await axeFindings(page)).toEqual([]);
  });

  it("on a scenario, with an editor open, and with every field open", async () => {
    const page = await journey.visit(options);
    await signIn(page, demoPeople.ines.email);
    await seeScenario(page, "Z carriage, creep feed");
    expect(await axeFindings(page)).toEqual([]);
    await valueOf(page, "Damping").click();
    await editorOf(page, "Damping").getByRole("slider").waitFor();
    await editorOf(page, "Damping").getByRole("textbox", { name: "Damping", exact: true }).fill("many");
    await page.getByText("Until then the answer keeps 350").waitFor();
    expect(await axeFindings(page)).toEqual([]);
    await page.keyboard.press("Escape");
    for (const group of ["Body", "Contact", "Drive", "Start, span", "Limits"])
      await page.getByRole("button", { name: `all fields of ${group}` }).press("Enter");
    expect(await axeFindings(page)).toEqual([]);
  });
});

it("axe finds nothing on other answers", async () => {
  const page = await journey.visit();
  await signIn(page, demoPeople.ines.email);
  for (const title of ["Turret, two-pad brake", "Tail clamp, shaken by the mill"]) {
    await seeScenario(page, title);
    expect(await axeFindings(page)).toEqual([]);
    await page.getByRole("link", { name: "Restband" }).click();
  }
});

/** Looks through the dialog that has opened, and closes it. */
async function inDialog(page: Page, title: string, contents: string): Promise<void> {
  const dialog = page.getByRole("dialog", { name: title });
  await dialog.getByText(contents).waitFor();
  expect(await axeFindings(page)).toEqual([]);
  await page.keyboard.press("Escape");
  await dialog.waitFor({ state: "hidden" });
}

/** From the projects to the drawn evidence of a scenario. */
async function seeScenario(page: Page, title: string): Promise<void> {
  await page.getByRole("link", { name: "Hall 3 refit" }).click();
  await openScenario(page, title);
  await expectText(answerOf(page)).toMatch(/^The (carriage|rotor|body) /);
  await page.locator(".js-plotly-plot .cartesianlayer").first().waitFor();
}
