import type { Anchor, Member } from "@restband/api/contract";
import { formatNumber } from "../../format/format-number.ts";

const seconds = (t: number): string => `${formatNumber(t, 4)}\u00a0s`;

/** What a comment is about, after the name of who said it: "at 0.036 s". */
export function sayAnchor(anchor: Anchor, labelOf: (path: string) => string): string {
  switch (anchor.kind) {
    case "whole":
      return "on the whole";
    case "field":
      return `on ${labelOf(anchor.path)}`;
    case "instant":
      return `at ${seconds(anchor.t)}`;
    case "span":
      return `from ${formatNumber(anchor.from, 4)} to ${seconds(anchor.to)}`;
  }
}

/** Those members whose names stand in what is said, each after an @. */
export function mentionsIn(words: string, members: readonly Pick<Member, "accountId" | "name">[]): string[] {
  const text = words.toLowerCase();
  return members.filter(({ name }) => text.includes(`@${name.toLowerCase()}`)).map(({ accountId }) => accountId);
}

/** What is said, with somebody named at its end. */
export function withMention(words: string, name: string): string {
  const gap = words === "" || /\s$/u.test(words) ? "" : " ";
  return `${words}${gap}@${name} `;
}
