import type { Motion, Unit } from "../../../format/unit.ts";
import { readEntries, unitTyped } from "../formula/entries.ts";
import type { Formula } from "../formula/formula.ts";
import { motionBehind, transmissionOf, type Kit } from "./kit.ts";
import type { Network } from "./network.ts";
import { isGroup, type Group, type Member, type Part } from "./part.ts";

/** A chain as numbers, or in words what keeps it from that. */
export type Compiled = { readonly network: Network } | { readonly missing: string };

/** Reads a part of a chain that stands where things move like `motion`. */
export function compilePart(part: Part, motion: Motion, kit: Kit): Compiled {
  return isGroup(part) ? compileGroup(part, motion, kit) : compileMember(part, motion, kit);
}

function compileMember(member: Member, motion: Motion, kit: Kit): Compiled {
  const formula = kit.members.find(({ key }) => key === member.formula);
  if (!formula || formula.result.measure.motion !== motion) return { missing: misplaced(member.name, motion) };
  const { values } = readEntries(formula, member.entries);
  if (!values) return { missing: `${nameOf(member)} still wants a number.` };
  const value = formula.value(values);
  const { measure } = formula.result;
  return { network: { id: member.id, name: nameOf(member), value, measure, unit: unitOfResult(formula, member) } };
}

/** A number from a sheet is said again in the unit it was typed in; what is computed, in the customary one. */
export function unitOfResult({ givens, expression }: Formula, { entries }: Member): Unit | undefined {
  const [{ key, measure }] = givens;
  return expression === `{${key}}` ? unitTyped(entries[key], measure) : undefined;
}

function compileGroup(group: Group, motion: Motion, kit: Kit): Compiled {
  if (group.parts.length === 0) return { missing: "A group without members is waiting for them, or to be taken away." };
  const ratio = ratioOf(group);
  if (ratio === null) return { missing: `The ratio of ${transmissionOf(group.through)?.label} still wants a number.` };
  const parts: Network[] = [];
  for (const part of group.parts) {
    const compiled = compilePart(part, motionBehind(group.through, motion), kit);
    if ("missing" in compiled) return compiled;
    parts.push(compiled.network);
  }
  return { network: { join: kit.canStandInSeries ? group.join : "parallel", ratio, parts } };
}

function ratioOf({ through, entries }: Group): number | null {
  const transmission = transmissionOf(through);
  if (!transmission) return 1;
  const { values } = readEntries(transmission, entries);
  return values && transmission.value(values);
}

export const nameOf = ({ name }: Member): string => name.trim() || "A member";

/** Said where a member stands on the wrong side of a transmission. */
export const misplaced = (name: string, motion: Motion): string =>
  motion === "linear"
    ? `${name} turns, but here things move straight. Put it in a group behind a screw or pulley.`
    : `${name} moves straight, but here things turn. Put it in a group behind an arm, or in front of the screw.`;
