import type { Revision, RevisionSummary, ScenarioSummary, StoredScenario } from "@restband/api/contract";
import { checkScenario, type Scenario } from "@restband/solver";
import { useQuery } from "@tanstack/react-query";
import { useMemo } from "react";
import { revisionQuery } from "../../api/revisions.ts";
import { scenarioQuery } from "../../api/scenarios.ts";
import { compareReference, paths } from "../../paths.ts";

/** One side of a comparison. */
export interface CompareSubject {
  /** "Revision 4", "Working copy", "Given values". */
  readonly name: string;
  readonly title: string;
  /** Where it is looked at by itself; null for what is stored nowhere. */
  readonly to: string | null;
  readonly scenario: Scenario;
  /** Where it is frozen: what it came to then, and how it stands. */
  readonly revision: Revision | null;
}

export interface SubjectReading {
  readonly subject: CompareSubject | null;
  /** A sentence where it cannot be read. */
  readonly trouble: string | null;
}

const GIVEN = "given:";
const REFERENCE = /^(scenario|revision):([0-9a-f-]{36})$/u;

/** Reads one side of a comparison by its reference in the address; null asks for nothing. */
export function useCompareSubject(projectId: string, reference: string | null): SubjectReading {
  const [, kind, id = ""] = REFERENCE.exec(reference ?? "") ?? [];
  const given = useMemo(() => givenIn(reference), [reference]);
  const scenario = useQuery({ ...scenarioQuery(projectId, id), enabled: kind === "scenario" });
  const revision = useQuery({ ...revisionQuery(projectId, id), enabled: kind === "revision" });
  if (given) return given;
  if (reference !== null && kind === undefined)
    return { subject: null, trouble: "The address names nothing that can be compared." };
  const asked = kind === "scenario" ? scenario : revision;
  if (asked.error) return { subject: null, trouble: asked.error.message };
  if (kind === "scenario") return { subject: scenario.data ? ofScenario(scenario.data) : null, trouble: null };
  return { subject: revision.data ? ofRevision(revision.data) : null, trouble: null };
}

/** What an address gives by itself: a checked scenario, or what is wrong with it; null where it names something stored. */
function givenIn(reference: string | null): SubjectReading | null {
  if (!reference?.startsWith(GIVEN)) return null;
  const { scenario, faults } = checkScenario(parsed(reference.slice(GIVEN.length)));
  if (!scenario) return { subject: null, trouble: `The address gives no whole scenario. ${faults[0].message}` };
  const title = scenario.title || "Untitled";
  return { subject: { name: "Given values", title, to: null, scenario, revision: null }, trouble: null };
}

function parsed(text: string): unknown {
  try {
    return JSON.parse(text) as unknown;
  } catch {
    return undefined;
  }
}

function ofScenario({ projectId, id, content }: StoredScenario): CompareSubject {
  const title = content.title || "Untitled";
  return { name: "Working copy", title, to: paths.scenario(projectId, id), scenario: content, revision: null };
}

function ofRevision(revision: Revision): CompareSubject {
  const { projectId, id, number, content, title } = revision;
  const to = paths.revision(projectId, id);
  return { name: `Revision ${number}`, title: title || "Untitled", to, scenario: content, revision };
}

/** Everything of a project that can be compared, each scenario followed by its revisions, newest first. */
export function compareChoices(
  scenarios: readonly ScenarioSummary[],
  revisions: readonly RevisionSummary[],
): { value: string; label: string }[] {
  return scenarios.flatMap(({ id, title, archivedAt }) => {
    const name = title || "Untitled";
    const frozen = revisions
      .filter(({ scenarioId }) => scenarioId === id)
      .map((each) => ({ value: compareReference.revision(each.id), label: `${name}, revision ${each.number}` }));
    const copy = { value: compareReference.scenario(id), label: name };
    return archivedAt === null ? [copy, ...frozen] : frozen;
  });
}
