import { checkScenario, type Scenario } from "@restband/solver";
import { useQuery } from "@tanstack/react-query";
import { useMemo, useState } from "react";
import { useParams } from "react-router-dom";
import { scenarioQuery, scenariosQuery } from "../../api/scenarios.ts";
import { samplesFor } from "../../compute/samples-for.ts";
import { useRun } from "../../compute/use-run.ts";
import type { Overlay } from "./overlay.ts";
import { runViewOf } from "./run-view.ts";

/** Which other scenario is drawn beside this one. */
export interface ScenarioOverlay {
  readonly isOpen: boolean;
  readonly open: () => void;
  /** Id and title of those there are; empty until they are read. */
  readonly others: readonly { id: string; title: string }[];
  readonly chosen: string;
  readonly choose: (id: string) => void;
  /** What stands in the way of the one chosen, or null. */
  readonly trouble: string | null;
  readonly overlays: readonly Overlay[];
}

/** Another scenario of the project whose page this is, computed here like this one. Nothing is read before somebody asks for it. */
export function useScenarioOverlay(motion: Scenario["motion"]): ScenarioOverlay {
  const { projectId = "", scenarioId = "" } = useParams();
  const [isOpen, setOpen] = useState(false);
  const [chosen, setChosen] = useState("");
  const list = useQuery({ ...scenariosQuery(projectId), enabled: isOpen });
  const stored = useQuery({ ...scenarioQuery(projectId, chosen), enabled: chosen !== "" });
  const content = chosen === "" ? undefined : stored.data?.content;
  const scenario = useMemo(() => (content ? (checkScenario(content).scenario ?? null) : null), [content]);
  const isAlike = scenario?.motion === motion;
  const samples = scenario ? samplesFor(scenario) : 2;
  const { computed } = useRun(
    isAlike ? scenario : null,
    useMemo(() => ({ samples }), [samples]),
  );
  const overlays = useMemo(() => {
    if (!isAlike || !computed || !("result" in computed)) return [];
    const view = runViewOf(computed.scenario, computed.result);
    return view ? [{ key: chosen, label: computed.scenario.title || "Untitled", samples: view.samples }] : [];
  }, [isAlike, computed, chosen]);
  return {
    isOpen,
    open: () => setOpen(true),
    others: (list.data ?? []).filter(({ id, archivedAt }) => id !== scenarioId && archivedAt === null),
    chosen,
    choose: setChosen,
    trouble: troubleOf({ hasFailed: stored.isError || list.isError, content, scenario, isAlike, computed }),
    overlays,
  };
}

interface Reading {
  readonly hasFailed: boolean;
  readonly content: unknown;
  readonly scenario: Scenario | null;
  readonly isAlike: boolean;
  readonly computed: ReturnType<typeof useRun>["computed"];
}

function troubleOf({ hasFailed, content, scenario, isAlike, computed }: Reading): string | null {
  if (hasFailed) return "The other scenario does not load.";
  if (!content) return null;
  if (!scenario) return "The other scenario has fields to put right.";
  if (!isAlike) return "The other body moves in another way: one turns, one slides.";
  return computed && "refusal" in computed ? computed.refusal.message : null;
}
