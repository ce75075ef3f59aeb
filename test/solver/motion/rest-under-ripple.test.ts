import { expect, test } from "vitest";
import { run } from "../../support/run.ts";
import { coulombForces } from "../../support/scenario-builder.ts";

// invented; expected by the definition: a body that needs no force stays where it is, held or not
test.each([
  [1.1, 30, 25],
  [1.05, 77, 25],
  [1.5, 0, 25],
  [1.2, 30, 2000],
])("a body that needs no force rests under a ripple that lets it go: %d N, %d°, %d s", (amplitude, phase, seconds) => {
  const contact = coulombForces(1);
  const ripple = { amplitude, hz: 0.2, phase };
  for (const untilRest of [false, true]) {
    const result = run({
      body: { inertia: 1, stiffness: 1 },
      contact: { ...contact, normal: { ...contact.normal, ripple } },
      span: { seconds, untilRest },
    });
    expect(result.events.map(({ kind }) => kind)).toEqual(["start", "end"]);
    expect([result.outcome, result.quantities.restTime]).toEqual(["never-moved", 0]);
  }
});
