import type { Energy, Result } from "@restband/solver";

/** A row of the energy ledger: what was put in counts positive, what left or stayed negative. J. */
export interface LedgerRow {
  readonly name: string;
  readonly value: number;
}

/** Names for a positive and a negative amount: what is "left in the spring" may have been "taken from" it. */
const entries: readonly { key: keyof Energy; sign: 1 | -1; positive: string; negative: string }[] = [
  { key: "workForce", sign: 1, positive: "Put in by the force", negative: "Taken out by the force" },
  { key: "workBase", sign: 1, positive: "Put in by the drive", negative: "Taken out by the drive" },
  { key: "workWeight", sign: 1, positive: "Put in by its weight", negative: "Spent on lifting it" },
  { key: "workCounterface", sign: 1, positive: "Put in by the counterface", negative: "Taken out by the counterface" },
  { key: "heatContact", sign: -1, positive: "Returned by the contact", negative: "Heat in the contact" },
  { key: "heatViscous", sign: -1, positive: "Returned by the damper", negative: "Heat in the damper" },
  {
    key: "heatSolid",
    sign: -1,
    positive: "Returned by the spring's material",
    negative: "Heat in the spring's material",
  },
  { key: "changeStored", sign: -1, positive: "Given up by the spring", negative: "Left in the spring" },
  { key: "changeKinetic", sign: -1, positive: "Given up by the motion", negative: "Left in motion" },
];

/** The entries that are not nothing, in the order of the equation. */
export function ledgerRows(energy: Energy): LedgerRow[] {
  return entries
    .filter(({ key }) => energy[key] !== 0)
    .map(({ key, sign, positive, negative }) => {
      const value = sign * energy[key];
      return { name: value > 0 ? positive : negative, value };
    });
}

/** The largest entry: what the residual is measured against, and the longest bar. */
export const largestEntry = (energy: Energy): number => Math.max(...entries.map(({ key }) => Math.abs(energy[key])));

/** The share of the largest entry that may remain unaccounted for. */
export const allowedShare = (method: Result["method"]): number => (method === "exact" ? 1e-9 : 1e-6);

export interface Balance {
  readonly residual: number;
  readonly allowed: number;
  readonly isBalanced: boolean;
}

/** Whether work, heat and change close, each of them integrated on its own. */
export function balanceOf(energy: Energy, method: Result["method"]): Balance {
  const allowed = allowedShare(method) * largestEntry(energy);
  return { residual: energy.residual, allowed, isBalanced: Math.abs(energy.residual) <= allowed };
}
