import type { SwitchedOff } from "@restband/api/contract";
import type { checkTerm, Scenario, Term } from "@restband/solver";
import { freshTerm, insertTerm, raiseItem, removeItem, type Place } from "./changes.ts";
import type { DraftAction, Sheet } from "./draft/draft.ts";
import { restructured } from "./draft/sheet.ts";
import { isUnder } from "./path.ts";

/** A term as the statement tells it: in force, with its place in the scenario, or switched off. */
export type TermRow = { readonly isOn: true; readonly index: number } | { readonly isOn: false; off: SwitchedOff };

/** The terms of a place in the order of the statement, those that are switched off where they were. */
export function termRows(scenario: Scenario, off: readonly SwitchedOff[], place: Place): TermRow[] {
  const away = off.filter((each) => each.place === place).sort((a, b) => a.index - b.index);
  const rows: TermRow[] = [];
  for (let on = 0; on < scenario[place].length || away.length > 0;) {
    const isAwayNext = away.length > 0 && (away[0].index <= rows.length || on === scenario[place].length);
    const next = isAwayNext ? away.shift() : undefined;
    rows.push(next ? { isOn: false, off: next } : { isOn: true, index: on++ });
  }
  return rows;
}

/** Takes a term out of force and keeps it with all that belongs to it, where it stands. `position` is that of its row. */
export const switchOff = (place: Place, position: number): DraftAction =>
  onRow(place, position, (sheet, row, inForce, check) => {
    if (!row.isOn) return sheet;
    const taken = takenOff(sheet, inForce, { place, index: row.index, position }, check);
    const rest = without(sheet, place, row.index);
    return { ...rest, off: [...aligned(sheet), taken] };
  });

/** Puts a term that is switched off in force again, in its old place. */
export const switchOn = (place: Place, position: number): DraftAction =>
  onRow(place, position, (sheet, row) => {
    if (row.isOn) return sheet;
    const { term, origins, units } = row.off;
    const at = rowsOf(sheet, place)
      .slice(0, position)
      .filter(({ isOn }) => isOn).length;
    const root = `${place}[${at}].`;
    const { apply, rename } = insertTerm(place, at, term, rooted(origins, root));
    const next = restructured(sheet, apply, rename);
    const off = aligned(sheet).filter((each) => each.place !== place || each.index !== position);
    return { ...next, units: { ...next.units, ...rooted(units, root) }, off };
  });

/** Takes a term away for good, whether it is in force or not. */
export const removeTerm = (place: Place, position: number): DraftAction =>
  onRow(place, position, (sheet, row) => {
    const rest = row.isOn ? without(sheet, place, row.index) : sheet;
    const others = aligned(sheet).filter((each) => each.place !== place || row.isOn || each.index !== position);
    return { ...rest, off: moved(others, place, (index) => (index > position ? index - 1 : index)) };
  });

/** Swaps a term with the one before it. */
export const raiseTerm = (place: Place, position: number): DraftAction =>
  onRow(place, position, (sheet, row) => {
    const before = rowsOf(sheet, place)[position - 1];
    if (row.isOn && before?.isOn) {
      const { apply, rename } = raiseItem(place, row.index);
      return restructured(sheet, apply, rename);
    }
    const swap = (index: number): number => {
      if (index === position) return position - 1;
      return index === position - 1 ? position : index;
    };
    return { ...sheet, off: moved(aligned(sheet), place, swap) };
  });

type Check = typeof checkTerm;
type Rewriting = (sheet: Sheet, row: TermRow, inForce: Scenario, check: Check) => Sheet;

function onRow(place: Place, position: number, rewrite: Rewriting): DraftAction {
  return {
    type: "rewrite",
    apply: (sheet, inForce, check) => {
      const row = rowsOf(sheet, place)[position];
      return row ? rewrite(sheet, row, inForce, check) : sheet;
    },
  };
}

const rowsOf = ({ wanted, off }: Sheet, place: Place): TermRow[] => termRows(wanted, off, place);

/** What is switched off, each with the position it is told at: terms may have come and gone since. */
function aligned(sheet: Sheet): SwitchedOff[] {
  const places = ["base", "force"] as const;
  return places.flatMap((place) =>
    rowsOf(sheet, place).flatMap((row, index) => (row.isOn ? [] : [{ ...row.off, index }])),
  );
}

const moved = (off: readonly SwitchedOff[], place: Place, move: (index: number) => number): SwitchedOff[] =>
  off.map((each) => (each.place === place ? { ...each, index: move(each.index) } : each));

function without(sheet: Sheet, place: Place, index: number): Sheet {
  const { apply, rename } = removeItem(place, index);
  return restructured(sheet, apply, rename);
}

interface Spot {
  readonly place: Place;
  readonly index: number;
  readonly position: number;
}

function takenOff(
  { wanted, units }: Sheet,
  inForce: Scenario,
  { place, index, position }: Spot,
  check: Check,
): SwitchedOff {
  const root = `${place}[${index}]`;
  return {
    place,
    index: position,
    term: soundTerm(place, wanted[place][index], inForce[place][index], check),
    origins: ownOf(wanted.origins, root),
    units: ownOf(units, root),
  };
}

/** Only what can be in force is kept: numbers that are refused give way to those in force. */
function soundTerm(place: Place, wanted: Term, inForce: Term | undefined, check: Check): Term {
  const before = inForce?.kind === wanted.kind ? check(place, inForce).term : null;
  return check(place, wanted).term ?? before ?? freshTerm(place, wanted.kind);
}

function ownOf<T>(record: Readonly<Record<string, T>>, root: string): Record<string, T> {
  const own = Object.entries(record).filter(([path]) => path !== root && isUnder(path, root));
  return Object.fromEntries(own.map(([path, value]) => [path.slice(root.length).replace(/^\./, ""), value]));
}

const rooted = <T>(record: Readonly<Record<string, T>>, root: string): Record<string, T> =>
  Object.fromEntries(Object.entries(record).map(([key, value]) => [root + key, value]));
