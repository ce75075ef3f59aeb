import { canonicalForm, storedForm } from "@restband/solver";
import type { Work } from "./work.ts";

/** The same with long records named by their digests: what a server needs that has their points. */
export function named({ content, switchedOff }: Work): Work {
  return {
    content: canonicalForm(content),
    switchedOff: switchedOff.map((off) => ({ ...off, term: storedForm(off.term) })),
  };
}
