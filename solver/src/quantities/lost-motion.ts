import type { Quantity } from "./quantity.ts";
import { travelsOf } from "./travel-end.ts";

export const lostMotion: Quantity = {
  name: "lostMotion",
  label: "Lost motion",
  dimension: "displacement",
  signed: false,
  meaning: "how far the base travels from the start of its first reverse travel until the body breaks away",
  absent: "the base does not reverse, or the body does not break away after it does",
  value: (reading) => {
    const [first, ...later] = travelsOf(reading.problem);
    const reverse = later.find(({ distance }) => distance * first.distance < 0);
    if (reverse === undefined) return null;
    const next = reading.breakAways.find((t) => t >= reverse.from);
    return next === undefined ? null : Math.abs(reading.at(next).base - reading.at(reverse.from).base);
  },
};
