/** 2 kg on 800 N/m, released; friction holds 2 N and takes 1.5 N while it slides. */
export const releasedBody = (displacement: number) => ({
  format: "restband-scenario/1",
  title: "Slide, released",
  motion: "linear",
  body: { inertia: 2, stiffness: 800 },
  contact: { law: { model: "coulomb", static: 0.2, kinetic: 0.15 }, normal: { preload: 10 } },
  initial: { displacement, velocity: 0 },
  span: { seconds: 5 },
});

/**
 * Its answer, worked out by hand: every half-swing lasts π√(m/k) and ends 2 Fk/k = 3.75 mm closer in, until one ends
 * within Fs/k = 2.5 mm.
 */
export function restOf(displacement: number): string {
  const swings = Math.ceil((displacement - 0.0025) / 0.00375);
  const seconds = swings * Math.PI * Math.sqrt(2 / 800);
  const offset = (displacement - swings * 0.00375) * 1e3;
  return `The body comes to rest after ${Number(seconds.toPrecision(3))} s, ${Number(offset.toPrecision(3))} mm off its equilibrium.`;
}
