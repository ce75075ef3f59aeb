import type { EventKind } from "@restband/solver";

export const eventWords: Record<EventKind, string> = {
  start: "starts",
  "break-away": "breaks away",
  stop: "stops",
  turn: "turns",
  end: "ends",
};
