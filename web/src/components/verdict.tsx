import type { Outcome } from "@restband/solver";
import type { ReactNode } from "react";
import "./verdict.css";

/** The words of a verdict over the pattern of its outcome; plain where there is none. */
export function Verdict({ outcome, children }: { outcome: Outcome | null; children: ReactNode }) {
  return <span className={outcome ? `verdict verdict-${outcome}` : undefined}>{children}</span>;
}
