import { useCallback, useMemo } from "react";
import { useSearchParams } from "react-router-dom";
import type { Standing } from "./headline.ts";

export const orders = ["touched", "title", "outcome", "broken"] as const;
export type Order = (typeof orders)[number];

/** How the list of scenarios is looked at. Empty strings: no matter which. */
export interface View {
  readonly order: Order;
  /** Words that the title holds. */
  readonly search: string;
  /** An outcome's name, or "none" for runs without one. */
  readonly outcome: string;
  readonly limits: Standing | "";
  /** The account that saved last. */
  readonly author: string;
  readonly isArchived: boolean;
}

const standings: readonly string[] = ["broken", "unjudged", "kept", "no-limits"] satisfies Standing[];

/** A view as an address has it; what is not understood counts as left out. */
export function readView(search: URLSearchParams): View {
  const get = (key: string) => search.get(key) ?? "";
  const limits = get("limits");
  return {
    order: orders.find((order) => order === get("order")) ?? "touched",
    search: get("search"),
    outcome: get("outcome"),
    limits: standings.includes(limits) ? (limits as Standing) : "",
    author: get("author"),
    isArchived: get("archived") === "yes",
  };
}

export function writeView({ order, search, outcome, limits, author, isArchived }: View): URLSearchParams {
  const values = { order: order === "touched" ? "" : order, search, outcome, limits, author };
  const given = Object.entries({ ...values, archived: isArchived ? "yes" : "" }).filter(([, value]) => value !== "");
  return new URLSearchParams(given);
}

/** True where answers decide which rows are shown, or in which order. */
export const needsAnswers = ({ order, outcome, limits }: View): boolean =>
  order === "outcome" || order === "broken" || outcome !== "" || limits !== "";

export const isNarrowed = ({ search, outcome, limits, author }: View): boolean =>
  [search, outcome, limits, author].some((value) => value !== "");

/** The view in the page's address: it can be kept, sent, and come back to. */
export function useView(): [View, (change: Partial<View>) => void] {
  const [search, setSearch] = useSearchParams();
  const view = useMemo(() => readView(search), [search]);
  const change = useCallback(
    (part: Partial<View>) =>
      setSearch((before) => writeView({ ...readView(before), ...part }), { replace: true, preventScrollReset: true }),
    [setSearch],
  );
  return [view, change];
}
