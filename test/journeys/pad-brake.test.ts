import { afterAll, afterEach, beforeAll, expect, it } from "vitest";
import { Journey } from "../support/journey.ts";
import { createProject, emailOf, signUp } from "../support/people.ts";
import {
  answerOf,
  beginScenario,
  change,
  choose,
  expectEvents,
  expectText,
  near,
  signIn,
  valueOf,
} from "../support/steps.ts";

let journey: Journey;
beforeAll(async () => {
  journey = await Journey.open();
});
afterAll(() => journey.close());
afterEach(() => expect(journey.complaints.splice(0)).toEqual([]));

/** 0.35 kg·m² at 720 turns a minute, two faces pressed by 210 N each at 90 mm, friction 0.38 while sliding. */
const speed = (720 / 60) * 2 * Math.PI;
const deceleration = (0.38 * 2 * 210 * 0.09) / 0.35;

it("brakes a rotor: at rest after ω/α, ω²/2α further on", async () => {
  const ada = await signUp(journey.server, "Ada");
  await createProject(ada, "Brakes");
  const page = await journey.visit();
  await signIn(page, emailOf("Ada"));
  await page.getByRole("link", { name: "Brakes" }).click();
  await beginScenario(page);
  await choose(page, "Motion", "rotor");
  await choose(page, "Purpose", "braking");
  await page.getByRole("button", { name: "all fields of Drive" }).click();
  await page.getByRole("button", { name: "Remove" }).click();
  await page.getByRole("button", { name: "Back to the sentence" }).click();
  await change(page, "Moment of inertia", "0.35");
  await change(page, "Torsional stiffness", "0");
  await change(page, "Damping", "0");
  await change(page, "Static friction", "0.42");
  await change(page, "Kinetic friction", "0.38");
  await change(page, "Preload per face", "210 N");
  await change(page, "Faces", "2");
  await change(page, "Effective radius", "90 mm");
  await change(page, "Starting velocity", "720 rpm");
  await change(page, "Length of the run", "2.5 s");

  const time = speed / deceleration;
  const angle = (speed * time) / 2;
  await expectText(answerOf(page)).toBe(
    `The rotor comes to rest after ${time.toFixed(2)} s, at ${angle.toFixed(1)} rad.`,
  );
  await expectText(page.getByRole("main")).toContain(
    `That is ${angle.toFixed(1)} rad, ${(angle / (2 * Math.PI)).toFixed(0)} turns from where it began.`,
  );
  await expectEvents(page, 2).toMatchObject([
    { event: "starts" },
    { event: "stops", time: near(time, 6), position: near(angle, 4) },
  ]);
  await expectText(page.getByRole("main")).toContain("must never be the only thing that holds");
  await expectText(valueOf(page, "Starting velocity")).toBe("720");
});
