import { Suspense, type ReactNode } from "react";
import { lazyPart } from "../components/lazy-part.ts";
import { Section } from "../components/section.tsx";
import type { RunView } from "../features/evidence/run-view.ts";

const Evidence = lazyPart(async () => (await import("../features/evidence/evidence.tsx")).Evidence);
const Checks = lazyPart(async () => (await import("../features/checks/checks.tsx")).Checks);
const EventTable = lazyPart(async () => (await import("../features/evidence/event-table.tsx")).EventTable);

interface RunEvidenceProps {
  readonly view: RunView;
  /** The time cursor, s. */
  readonly t: number;
  readonly onMove: (t: number) => void;
  readonly isStale: boolean;
  /** What stands beside the names of the two sections. */
  readonly help: { readonly evidence: ReactNode; readonly checks: string };
}

/** A run's motion, its own checks and its events, under one time cursor. */
export function RunEvidence({ view, t, onMove, isStale, help }: RunEvidenceProps) {
  return (
    <>
      <Section id="evidence" name="Evidence" help={help.evidence}>
        <Suspense fallback={<div className="min-h-[600px]" />}>
          <Evidence view={view} t={t} onMove={onMove} isStale={isStale} />
        </Suspense>
      </Section>
      <Section id="checks" name="Checks" help={help.checks}>
        <Suspense fallback={<div className="min-h-[420px]" />}>
          <Checks scenario={view.scenario} result={view.result} />
        </Suspense>
        <h3 className="mt-8 mb-2 text-15 font-semibold">Events</h3>
        <Suspense fallback={<div className="min-h-[380px]" />}>
          <EventTable view={view} t={t} onMove={onMove} />
        </Suspense>
      </Section>
    </>
  );
}

/** The keys that move the time cursor. */
export const eventKeys = <span className="whitespace-nowrap">← →</span>;
