import type { Page } from "playwright-core";
import { afterAll, afterEach, beforeAll, expect, it } from "vitest";
import { axeFindings } from "../support/axe.ts";
import { Journey } from "../support/journey.ts";
import { addMember, createProject, createScenario, emailOf, signUp } from "../support/people.ts";
import { signIn } from "../support/steps.ts";

let journey: Journey;
let projectId: string;
let scenarioId: string;
beforeAll(async () => {
  journey = await Journey.open();
  const ada = await signUp(journey.server, "Ada");
  await signUp(journey.server, "Bo");
  projectId = await createProject(ada);
  await addMember(ada, projectId, emailOf("Bo"), "reader");
  scenarioId = (await createScenario(ada, projectId, slide)).id;
});
afterAll(() => journey.close());
afterEach(() => expect(journey.complaints.splice(0)).toEqual([]));

/**
 * ζ = 0.05 and ΔF = 200 N on 1000 kg and 1e8 N/m: the exact root of "velocity never regains V" is
 * 1.09809 ΔF/√(km) = 0.694495 mm/s, 41.67 mm/min.
 */
const slide = {
  format: "restband-scenario/1",
  title: "Heavy slide",
  purpose: "feed",
  motion: "linear",
  body: { inertia: 1000, stiffness: 1e8, viscous: 2 * 0.05 * Math.sqrt(1e8 * 1000) },
  contact: { law: { model: "coulomb", static: 0.3, kinetic: 0.2 }, normal: { preload: 2000 } },
  base: [{ kind: "ramp", rate: 0.0003 }],
  span: { seconds: 0.5, untilRest: false },
  limits: [{ quantity: "stickFraction", max: 0 }],
};

const explore = async (name: string): Promise<Page> => {
  const page = await journey.visit();
  await signIn(page, emailOf(name));
  await page.goto(`/projects/${projectId}/scenarios/${scenarioId}`);
  await page.getByRole("link", { name: "Explore" }).click();
  return page;
};

it("a newcomer finds the lowest feed with its bracket, the formula beside it, and a scenario of it", async () => {
  const page = await explore("Ada");
  await page.getByRole("button", { name: "Search", exact: true }).click();
  const headline = page.getByText(/^The carriage slides without sticking from .* of feed on\.$/);
  await headline.waitFor();
  const value = Number(/from (.*)\s(.*) of feed/.exec((await headline.textContent()) ?? "")?.[1]);
  expect(value).toBeGreaterThanOrEqual(0.69449);
  expect(value / 0.694495 - 1).toBeLessThan(2e-3);
  const bracket = (await page.getByText(/still sticks and slips, .* slides\./).textContent()) ?? "";
  const [low, high] = [...bracket.matchAll(/[\d.]+(?=\s[μm]m\/s)/g)].map(([text]) => Number(text));
  expect(low).toBeLessThan(0.6945);
  expect(high).toBeGreaterThan(0.69449);
  expect(high / low - 1).toBeLessThan(2e-4);
  await page.getByRole("region", { name: "The same by formula" }).getByText("0.6945 mm/s").waitFor();

  await page.getByRole("button", { name: /^Make a scenario at/ }).click();
  await page.waitForURL(/scenarios\/(?!.*explore)/);
  await page
    .getByText(/slides smoothly|has not settled/)
    .first()
    .waitFor();
});

it("a sweep of two fields fills, is kept over a reload, and a reader sees the same", async () => {
  const page = await explore("Ada");
  const sweep = page.getByRole("region", { name: "Sweep" });
  await sweep.getByRole("group", { name: "Across" }).getByLabel("values").fill("6");
  await sweep.getByRole("group", { name: "Up" }).getByLabel("values").fill("5");
  await sweep.getByRole("button", { name: "Run the sweep" }).click();
  await page.waitForURL(/explore\/[0-9a-f-]{36}$/);
  // μs = 1.5 μk on 2000 N: ΔF = 1000 N for each 1.0 of μk, and 0.694495 mm/s for 200 N.
  const rule = page.getByRole("heading", {
    name: /^Smooth sliding needs about .* of feed for every 0\.1 of kinetic friction/,
  });
  await rule.waitFor({ timeout: 60_000 });
  const [, needed] = /about ([\d.]+)\s.m\/s/.exec((await rule.textContent()) ?? "") ?? [];
  expect([350, 0.35]).toContain(Number(needed));

  await page.getByText("Of 30 cells").first().waitFor();
  await page.getByText("limit of smooth sliding", { exact: true }).waitFor();
  expect(await axeFindings(page)).toEqual([]);
  await page.reload();
  await rule.waitFor({ timeout: 60_000 });
  const reader = await journey.visit();
  await signIn(reader, emailOf("Bo"));
  await reader.goto(page.url());
  await reader.getByRole("heading", { name: (await rule.textContent()) ?? "" }).waitFor({ timeout: 60_000 });
  expect(await reader.getByRole("button", { name: "Open as scenario" }).count()).toBe(0);

  const map = page.getByRole("application");
  const before = await map.textContent();
  await map.press("ArrowRight");
  await expect.poll(() => map.textContent()).not.toBe(before);
  await page.getByRole("button", { name: "Open as scenario" }).waitFor();
  await map.press("Enter");
  await page.waitForURL(/scenarios\/(?!.*explore)/);
});

it("a study lets values scatter by a covariance that is pasted, and says how likely the limit is kept", async () => {
  const page = await explore("Ada");
  const tolerance = page.getByRole("region", { name: "Tolerance" });
  await tolerance.getByRole("button", { name: "Let values scatter by a covariance" }).click();
  await tolerance.getByText("Paste a fit").click();
  // a mass of 1000 ± 10 kg and a stiffness of 100 ± 2 N/μm, correlated by −0.5
  await tolerance.getByRole("combobox", { name: "Scatter together" }).selectOption("mass");
  await tolerance.getByRole("combobox", { name: "with", exact: true }).selectOption("stiffness");
  await tolerance.getByLabel("Estimates, then their covariance row by row").fill("1000 100\n100 -10\n-10 4");
  await tolerance.getByRole("button", { name: "Take it over" }).click();
  await tolerance.getByLabel("Source").fill("Pull test 2");
  const kinetic = tolerance.getByRole("group", { name: "kinetic friction scatters" });
  await kinetic.getByLabel("to", { exact: true }).fill("0.4");
  await tolerance.getByLabel("Draws").fill("200");
  await tolerance.getByRole("button", { name: "Run the study" }).click();
  await page.getByRole("heading", { level: 1, name: /keeps its limit in/ }).waitFor();
  const asked = "mass and stiffness together, normal about 1000 kg and 100 N/μm with deviations of 10 kg and 2 N/μm";
  await page.getByText(`${asked}, correlated by −0.5 (Pull test 2)`.replace(/ (?=kg|N)/g, "\u00a0")).waitFor();
  await page.getByText(/draws have no answer: their static friction cannot stand with the rest\./).waitFor();
  await page.getByText("An example").click();
  await page
    .getByText(/^Draw \d+: Static friction cannot be smaller than kinetic friction; they are 0\.\d{1,4} and/)
    .waitFor();
  expect(await axeFindings(page)).toEqual([]);
});

it("what cannot be swept is said at its field, and nothing typed is lost", async () => {
  const page = await explore("Ada");
  const across = page.getByRole("region", { name: "Sweep" }).getByRole("group", { name: "Across" });
  await across.getByLabel("from", { exact: true }).fill("0.5");
  await across.getByText("The range is reversed: it starts at 0.5 and ends at 0.4.").waitFor();
  await across.getByLabel("from", { exact: true }).fill("half");
  await across.getByText("“half” is not a number.").waitFor();
  await page.getByRole("button", { name: "Run the sweep" }).click();
  expect(page.url()).toMatch(/explore$/);
  expect(await across.getByLabel("from", { exact: true }).inputValue()).toBe("half");
});
