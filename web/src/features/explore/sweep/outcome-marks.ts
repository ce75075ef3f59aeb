import type { Outcome } from "@restband/solver";

/**
 * How an outcome fills a place of a map: a pattern of the page (or the plain slip colour), and how much of the place's
 * height. Pattern first, colour last: each is told apart without colour.
 */
export interface OutcomeMark {
  readonly fill: string;
  /** The token its colour is of, for what is drawn on a canvas. */
  readonly token: "slip" | "stick" | "quiet" | "broken" | "band-line";
  readonly hatch: "plain" | "diagonal" | "dots" | "cross" | "lines" | "waves";
}

export const outcomeMarks: Record<Outcome, OutcomeMark> = {
  "smooth-sliding": { fill: "var(--slip)", token: "slip", hatch: "plain" },
  settles: { fill: "url(#hatch-back)", token: "slip", hatch: "lines" },
  "stick-slip": { fill: "url(#hatch-stick)", token: "stick", hatch: "diagonal" },
  growing: { fill: "url(#hatch-broken)", token: "broken", hatch: "cross" },
  "came-to-rest": { fill: "url(#hatch-rest)", token: "band-line", hatch: "lines" },
  "never-moved": { fill: "url(#hatch-never)", token: "quiet", hatch: "dots" },
  "too-short": { fill: "url(#hatch-never)", token: "quiet", hatch: "dots" },
  "not-settled": { fill: "url(#hatch-not-settled)", token: "slip", hatch: "waves" },
};

/** Likewise of a limit: kept is solid, broken is crossed, as on its ruler. */
export const verdictMarks = {
  kept: outcomeMarks["smooth-sliding"],
  broken: outcomeMarks.growing,
} as const satisfies Record<string, OutcomeMark>;
