import { simulate, traceOf } from "@restband/solver";
import { type Comment, keptResultOf, type Revision, type StoredScenario } from "../../api/src/contract.ts";
import type { Browser } from "./browser.ts";
import { createScenario, password, smallScenario } from "./people.ts";

/** What a page sends to freeze a scenario: its own run of what it has seen. */
export function freezeBody({ content, digest }: Pick<StoredScenario, "content" | "digest">) {
  const result = simulate(content, { samples: 201 });
  if ("error" in result) throw new Error(result.error.message);
  return { digest, units: "millimetre" as const, result: keptResultOf(result), trace: traceOf(result.samples!) };
}

/** Freezes the version of a scenario that was read. */
export function freeze(author: Browser, scenario: StoredScenario): Promise<Revision> {
  const { projectId, id: scenarioId, version } = scenario;
  const request = { params: { projectId, scenarioId }, version, body: freezeBody(scenario) };
  return author.get<Revision>("freezeScenario", request);
}

/** A new scenario and its first revision. */
export async function createRevision(author: Browser, projectId: string, content: object = smallScenario) {
  return freeze(author, await createScenario(author, projectId, content));
}

export const placeOf = ({ projectId, id: revisionId }: Revision) => ({ projectId, revisionId });

/** What a decision is sent with, all right. */
export const decisionOn = ({ digest }: Revision) => ({
  reasons: "Looked through, all as it should be.",
  password,
  digest,
  replayId: null,
  checklist: [],
});

export const smallReplay = {
  way: "same-method",
  solverVersion: "0.2.0",
  verdict: "agrees",
  allowed: 1e-9,
  differences: [],
  deviations: [{ what: "restTime", values: [1, 1], absolute: 0, relative: 0 }],
  convergence: [],
};

export const smallComment = { anchor: { kind: "instant", t: 0.5 }, words: "Why does it stop here?", mentions: [] };

export async function createComment(commenter: Browser, revision: Revision): Promise<Comment> {
  return commenter.get<Comment>("addComment", { params: placeOf(revision), body: smallComment });
}
