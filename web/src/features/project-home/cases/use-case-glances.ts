import { digestOf, type Scenario } from "@restband/solver";
import { useEffect, useMemo, useState, useSyncExternalStore } from "react";
import { solverPool } from "../../../compute/solver-pool.ts";
import { GlanceBook, type Glance } from "../glances/glance-book.ts";
import type { Case } from "./build-cases.ts";

/** Runs the rows that are scenarios, the first first; null for a row that has none yet. */
export function useCaseGlances(cases: readonly Case[]): (Glance | undefined)[] {
  const [{ book, contents }] = useState(makeBook);
  useSyncExternalStore(book.subscribe, book.editionNow);
  const digests = useMemo(() => cases.map(({ scenario }) => scenario && digestOf(scenario)), [cases]);
  useEffect(() => {
    contents.clear();
    digests.forEach((digest, i) => {
      const { scenario } = cases[i];
      if (digest && scenario) contents.set(digest, scenario);
    });
    book.want(
      "",
      [...contents.keys()].map((digest) => ({ id: digest, digest })),
    );
    return () => book.want("", []);
  }, [book, contents, cases, digests]);
  return digests.map((digest) => (digest ? book.get(digest) : undefined));
}

/** A book that reads from the table itself. */
function makeBook() {
  const contents = new Map<string, Scenario>();
  const book = new GlanceBook({
    read: (_, digests) =>
      Promise.resolve(
        digests.flatMap((digest) => {
          const content = contents.get(digest);
          return content ? [{ digest, content }] : [];
        }),
      ),
    run: (scenario, client) => solverPool.request(client, { scenario, options: { samples: 2, energy: false } }),
    lanes: 2,
    batch: 20,
    pause: 1000,
  });
  return { book, contents };
}
