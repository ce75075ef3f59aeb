import { say, sayShare } from "../../../format/format-quantity.ts";
import type { Motion } from "../../../format/unit.ts";
import { readEntries } from "../formula/entries.ts";
import { valuesText } from "../formula/expression.ts";
import { nameOf, unitOfResult } from "./compile-chain.ts";
import { motionBehind, transmissionOf, type Kit } from "./kit.ts";
import { largest, type Share } from "./network.ts";
import { isGroup, type Group, type Member, type Part } from "./part.ts";

/** The whole chain in a sentence, for the origin of its value: every member with its numbers, how they are joined, and the largest part. */
export function chainSentence(root: Group, shares: readonly Share[], motion: Motion, kit: Kit): string {
  const most = largest(shares);
  const last = shares.length > 1 ? ` ${kit.most(most.name, sayShare(most.share))}` : "";
  return `${groupWords(root, motion, kit)} (textbook, from memory).${last}`;
}

function groupWords(group: Group, motion: Motion, kit: Kit): string {
  const transmission = transmissionOf(group.through);
  const parts = group.parts.map((part) => partWords(part, motionBehind(group.through, motion), kit));
  const words =
    parts.length < 2 || !kit.canStandInSeries ? parts.join(" + ") : `${joinWords[group.join]}: ${parts.join("; ")}`;
  if (!transmission) return words;
  const { values } = readEntries(transmission, group.entries);
  const numbers = values ? ` (${valuesText(transmission, values, group.entries)})` : "";
  return `behind ${transmission.label}${numbers}: [${words}]`;
}

const joinWords: Readonly<Record<Group["join"], string>> = { series: "in series", parallel: "side by side" };

function partWords(part: Part, motion: Motion, kit: Kit): string {
  if (!isGroup(part)) return memberWords(part, kit);
  const words = groupWords(part, motion, kit);
  return part.through || part.parts.length < 2 ? words : `[${words}]`;
}

/** "screw shaft (E 210 GPa, d 20 mm, L 500 mm) 132 N/μm"; a number from a sheet stands alone. */
function memberWords(member: Member, kit: Kit): string {
  const formula = kit.members.find(({ key }) => key === member.formula);
  const values = formula && readEntries(formula, member.entries).values;
  if (!formula || !values) return nameOf(member);
  const unit = unitOfResult(formula, member);
  const said = say(formula.value(values), formula.result.measure, { unit, digits: 4 });
  const numbers = unit ? "" : ` (${valuesText(formula, values, member.entries)})`;
  return `${nameOf(member)}${numbers} ${said}`;
}
