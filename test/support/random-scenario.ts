import type { Scenario } from "@restband/solver";
import { mulberry32 } from "./mulberry32.ts";
import { driveKinds, type Draw, type Drive, type Frame } from "./random-drives.ts";
import { buildScenario, type ScenarioSketch } from "./scenario-builder.ts";

/** The kinds of drive by name: seed n draws one of kind n modulo their number. */
export const driveNames = Object.keys(driveKinds);
const drives = Object.values<Drive>(driveKinds);

/** The scenario of a seed: every seed in turn another kind of drive, its body, friction and numbers drawn. */
export function randomScenario(seed: number): Scenario {
  const random = mulberry32(seed);
  const draw: Draw = {
    between: (low, high) => low + (high - low) * random(),
    of: (list) => list[Math.floor(random() * list.length)],
    sign: () => (random() < 0.5 ? -1 : 1),
  };
  const frame = drawFrame(draw);
  const drive = drives[seed % drives.length](draw, frame);
  return buildScenario({ ...drawBody(draw, frame, drive), ...drive, contact: drawContact(draw, frame, drive) });
}

function drawFrame(draw: Draw): Frame {
  const inertia = draw.between(0.5, 5);
  const hz = draw.between(0.8, 4);
  return { inertia, hz, stiffness: inertia * (2 * Math.PI * hz) ** 2, length: draw.between(0.01, 0.1) };
}

function drawBody(
  draw: Draw,
  { inertia, stiffness, hz, length }: Frame,
  drive: Partial<ScenarioSketch>,
): ScenarioSketch {
  const ratio = draw.of([0, 0, draw.between(0.01, 0.1), draw.between(0.1, 0.6), 1.3]);
  const hasHarmonic = [...(drive.force ?? []), ...(drive.base ?? [])].some((term) => term.kind === "harmonic");
  return {
    body: { inertia, stiffness, viscous: 2 * ratio * Math.sqrt(stiffness * inertia) },
    solid: draw.of<ScenarioSketch["solid"]>([
      { model: "none" },
      { model: "none" },
      { model: "equivalent-viscous", lossFactor: draw.between(0.01, 0.2), at: hasHarmonic ? "drive" : "natural" },
      { model: "equivalent-viscous", lossFactor: draw.between(0.01, 0.2), at: { hz: draw.between(1, 3) } },
    ]),
    initial: {
      displacement: draw.of([0, 1]) * draw.between(-1, 1) * length,
      velocity: draw.of([0, 1]) * draw.between(-1, 1) * length * hz * 6,
    },
    span: { seconds: draw.between(8, 14) / hz, untilRest: false },
  };
}

/** A Coulomb contact whose slip force moves the spring by a small part of the motion's length. */
function drawContact(
  draw: Draw,
  { stiffness, length }: Frame,
  drive: Partial<ScenarioSketch>,
): ScenarioSketch["contact"] {
  const kinetic = draw.between(0.1, 0.4);
  const excess = draw.of([1, draw.between(1.05, 1.8)]);
  const radius = drive.motion === "angular" ? draw.between(0.05, 0.3) : 1;
  const faces = draw.of([1, 2]);
  const preload = (draw.between(0.03, 0.3) * stiffness * length) / (kinetic * radius * faces);
  return {
    law: { model: "coulomb", static: kinetic * excess, kinetic },
    radius,
    ...drive.contact,
    normal: { preload, faces, ...scaled(drive.contact?.normal, preload * faces) },
  };
}

/** A drive gives a ripple as parts of N. */
function scaled(normal: NonNullable<ScenarioSketch["contact"]>["normal"], mean: number): typeof normal {
  if (!normal?.ripple) return normal;
  return { ...normal, ripple: { ...normal.ripple, amplitude: normal.ripple.amplitude * mean } };
}
