import type { ScenarioSummary } from "@restband/api/contract";
import { useQueryClient } from "@tanstack/react-query";
import { useNavigate } from "react-router-dom";
import { scenarioQuery, useScenarioActs } from "../../api/scenarios.ts";
import { announce } from "../../components/status.tsx";
import { compareReference, paths } from "../../paths.ts";
import { copyTitle } from "./copy-title.ts";
import { fileNameOf, saveFile } from "../../components/save-file.ts";
import type { RowActs } from "./row-menu.tsx";

/** Does a thing and says so, with the way back; what is refused is said in the server's words. */
async function tell(act: () => Promise<{ text: string; undo?: () => void }>): Promise<void> {
  try {
    const { text, undo } = await act();
    announce(text, undo);
  } catch (error) {
    announce(error instanceof Error ? error.message : String(error));
  }
}

const nameOf = ({ title }: Pick<ScenarioSummary, "title">): string => `“${title || "Untitled"}”`;

/** The acts of a project's rows; `taken` are the titles that copies must not repeat. */
export function useRowActs(projectId: string, taken: () => readonly string[], onMove: (s: ScenarioSummary) => void) {
  const acts = useScenarioActs();
  const client = useQueryClient();
  const navigate = useNavigate();
  const textOf = async ({ id }: ScenarioSummary): Promise<string> => {
    const { content } = await client.fetchQuery(scenarioQuery(projectId, id));
    return `${JSON.stringify(content, null, 2)}\n`;
  };
  const archive = (summary: ScenarioSummary): Promise<void> =>
    tell(async () => {
      await acts.archive(projectId, summary.id);
      return { text: `${nameOf(summary)} is archived.`, undo: () => void restore(summary) };
    });
  const restore = (summary: ScenarioSummary): Promise<void> =>
    tell(async () => {
      await acts.restore(projectId, summary.id);
      return { text: `${nameOf(summary)} is in use again.`, undo: () => void archive(summary) };
    });
  const duplicate = (summary: ScenarioSummary): Promise<void> =>
    tell(async () => {
      const { id, content } = await acts.duplicate(projectId, summary.id, copyTitle(summary.title, taken()));
      const undo = () => void archive({ ...summary, id, title: content.title });
      return { text: `${nameOf(content)} is there, last touched by you.`, undo };
    });
  const copy = (summary: ScenarioSummary): Promise<void> =>
    tell(async () => {
      await navigator.clipboard.writeText(await textOf(summary));
      return { text: `${nameOf(summary)} is copied as JSON.` };
    });
  const save = (summary: ScenarioSummary): Promise<void> =>
    tell(async () => {
      const name = fileNameOf(summary.title, "json");
      saveFile(name, "application/json", await textOf(summary));
      return { text: `${name} is saved.` };
    });
  const rowActs: RowActs = {
    archive: (summary) => void archive(summary),
    restore: (summary) => void restore(summary),
    duplicate: (summary) => void duplicate(summary),
    copy: (summary) => void copy(summary),
    save: (summary) => void save(summary),
    compare: ({ id }) => void navigate(paths.compare(projectId, compareReference.scenario(id))),
    cases: ({ id }) => void navigate(paths.cases(projectId, id)),
    move: onMove,
  };
  /** Takes a scenario into another project, and back by Undo; a refusal is left to the caller. */
  const move = async (summary: ScenarioSummary, target: { id: string; name: string }): Promise<void> => {
    await acts.move(projectId, summary.id, target.id);
    const back = () =>
      void tell(async () => {
        await acts.move(target.id, summary.id, projectId);
        return { text: `${nameOf(summary)} is back.` };
      });
    announce(`${nameOf(summary)} is in “${target.name}” now.`, back);
  };
  return { rowActs, move };
}
