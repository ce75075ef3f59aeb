/** A scenario with only what must be given, as plain data; `change` replaces members at the top. */
export function plainScenario(change: object = {}): Record<string, unknown> {
  return {
    format: "restband-scenario/1",
    motion: "linear",
    body: { inertia: 2, stiffness: 800 },
    contact: { law: { model: "coulomb", static: 0.2, kinetic: 0.1 }, normal: { preload: 40 } },
    span: { seconds: 1 },
    ...change,
  };
}

const normal = { preload: 40 };
const law = { model: "coulomb", static: 0.2, kinetic: 0.1 };

/** `plainScenario` with another law, normal force or counterface. */
export const withContact = (change: object, rest: object = {}) =>
  plainScenario({ contact: { law, normal, ...change }, ...rest });
