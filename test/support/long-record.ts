import { smallScenario } from "./people.ts";

/** A record of more points than a canonical text holds: a force that swings for five seconds. */
export function longRecord(amplitude = 3, points = 1500) {
  const times = Array.from({ length: points }, (_, i) => (5 * i) / points);
  return { kind: "record", times, values: times.map((t) => amplitude * Math.sin(7 * t)) };
}

export const recordScenario = (record: object = longRecord(), title = "Recorded") => ({
  ...smallScenario,
  title,
  force: [record],
});
