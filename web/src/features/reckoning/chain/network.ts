import type { Measure, Unit } from "../../../format/unit.ts";

/** Members joined into a whole, as numbers: what a chain on the page comes down to. */
export type Network = Leaf | Joint;

export interface Leaf {
  readonly id: number;
  readonly name: string;
  /** Stiffness or inertia of the member by itself, SI, above 0. */
  readonly value: number;
  readonly measure: Measure;
  /** The unit it was typed in, where it is a number from a sheet. */
  readonly unit?: Unit;
}

export interface Joint {
  /** `series`: each carries the whole force and the deflections add up. `parallel`: all move alike and what they carry adds up; inertias always do. */
  readonly join: "series" | "parallel";
  /** n, motion of the parts per motion of what is in front of them; the whole counts n² there. */
  readonly ratio: number;
  readonly parts: readonly Network[];
}

/** A member's part in the whole. */
export interface Share extends Leaf {
  /** Its value seen at the body, alone: n² times its own. */
  readonly seen: number;
  /**
   * Its part of the whole, 0…1, all parts together 1. In series its part of the compliance; anywhere its part of the
   * energy stored, which is also the part by which the whole rises when this member rises by a little, ∂ln K/∂ln k.
   */
  readonly share: number;
}

/** Stiffness (or inertia) of the whole as the body feels it, SI: series 1/Σ(1/k), parallel Σk, behind a ratio n² times. */
export function valueOf(network: Network): number {
  if (!("parts" in network)) return network.value;
  const values = network.parts.map(valueOf);
  const joined = network.join === "parallel" ? sum(values) : 1 / sum(values.map((value) => 1 / value));
  return joined * network.ratio ** 2;
}

/** Every member's part in the whole, in the order of the chain. */
export function sharesOf(network: Network, share = 1, ratio = 1): Share[] {
  if (!("parts" in network)) return [{ ...network, seen: network.value * ratio ** 2, share }];
  const weights = network.parts.map((part) => (network.join === "parallel" ? valueOf(part) : 1 / valueOf(part)));
  const all = sum(weights);
  return network.parts.flatMap((part, i) => sharesOf(part, (share * weights[i]) / all, ratio * network.ratio));
}

/** The member with the largest part: in a chain of springs the weakest. The first of several that are alike. */
export const largest = (shares: readonly Share[]): Share =>
  shares.reduce((most, share) => (share.share > most.share ? share : most));

const sum = (values: readonly number[]): number => values.reduce((total, value) => total + value, 0);
