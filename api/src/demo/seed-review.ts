import { agreementOf, type Scenario, simulate, traceOf } from "@restband/solver";
import type { Account } from "../accounts/accounts-schema.ts";
import type { CommentsService } from "../comments/comments-service.ts";
import type { DecisionsService } from "../reviews/decisions-service.ts";
import type { ReviewsService } from "../reviews/reviews-service.ts";
import { keptResultOf, type ReplayDraft, resultOf, type Revision } from "../revisions/revisions-schema.ts";
import type { RevisionsService } from "../revisions/revisions-service.ts";
import type { ScenariosService } from "../scenarios/scenarios-service.ts";
import type { DemoReview } from "./demo-project.ts";

export interface ReviewServices {
  readonly scenarios: ScenariosService;
  readonly revisions: RevisionsService;
  readonly comments: CommentsService;
  readonly reviews: ReviewsService;
  readonly decisions: DecisionsService;
}

interface Parts {
  readonly projectId: string;
  readonly maker: Account;
  readonly reviewer: Account;
}

/**
 * A scenario with its history: frozen as it was first, looked at and returned, changed to what it is, frozen again and
 * accepted; all by the services that everybody's work goes through.
 */
export async function seedReview(
  services: ReviewServices,
  parts: Parts,
  content: unknown,
  { first, returned, accepted, checklist }: DemoReview,
): Promise<void> {
  const { projectId, maker } = parts;
  const { id: scenarioId } = await services.scenarios.create(projectId, { content: first }, maker.id);
  const place = { projectId, scenarioId };
  const one = await freezeAndAsk(services, parts, scenarioId, returned.request);
  const replayed = await replay(services, parts, one);
  for (const { answer, ...comment } of returned.comments) {
    const { id: commentId } = await services.comments.add(
      placeOf(one),
      { mentions: [], ...comment },
      parts.reviewer.id,
    );
    if (answer)
      await services.comments.reply({ ...placeOf(one), commentId }, { words: answer, mentions: [] }, maker.id);
  }
  await decide(services, parts, one, replayed, { decision: "return", reasons: returned.reasons, checklist: [] });
  await services.scenarios.save(place, 1, { content }, maker.id);
  const two = await freezeAndAsk(services, parts, scenarioId, accepted.request);
  const again = await replay(services, parts, two);
  for (const { anchor, words } of accepted.comments) {
    const comment = await services.comments.add(placeOf(two), { anchor, words, mentions: [] }, parts.reviewer.id);
    await services.comments.settle({ ...placeOf(two), commentId: comment.id }, parts.reviewer.id);
  }
  const answers = checklist.map((point) => ({ point, answer: "yes" as const }));
  await decide(services, parts, two, again, { decision: "accept", reasons: accepted.reasons, checklist: answers });
}

async function freezeAndAsk(
  { scenarios, revisions, reviews }: ReviewServices,
  { projectId, maker, reviewer }: Parts,
  scenarioId: string,
  message: string,
): Promise<Revision> {
  const { content, digest, version } = await scenarios.read(projectId, scenarioId);
  const result = run(content);
  const body = { digest, units: "millimetre" as const, result: keptResultOf(result), trace: traceOf(result.samples!) };
  const revision = await revisions.freeze({ projectId, scenarioId }, version, body, maker.id);
  const actor = { account: maker };
  await reviews.ask(placeOf(revision), { reviewers: [reviewer.id], message }, actor);
  return revision;
}

/** Runs a revision again, as the reviewer's browser would. */
async function replay({ revisions }: ReviewServices, { reviewer }: Parts, revision: Revision): Promise<string> {
  const { verdict, allowed, differences, deviations } = agreementOf(resultOf(revision.result), run(revision.content));
  const draft: ReplayDraft = {
    ...{ way: "same-method", solverVersion: revision.solverVersion, verdict, allowed, convergence: [] },
    ...{ differences: [...differences], deviations: deviations.map((each) => ({ ...each, values: [...each.values] })) },
  };
  return (await revisions.keepReplay(placeOf(revision), draft, reviewer.id)).id;
}

function decide(
  { decisions }: ReviewServices,
  { reviewer }: Parts,
  revision: Revision,
  replayId: string,
  decision: Pick<Parameters<DecisionsService["decide"]>[1], "decision" | "reasons" | "checklist">,
): Promise<void> {
  // Nobody types it here: who seeds the demo knows the password of all its people.
  const signer = { account: reviewer, confirm: () => Promise.resolve() };
  const given = { ...decision, digest: revision.digest, replayId, password: "" };
  return decisions.decide(placeOf(revision), given, signer);
}

function run(scenario: Scenario) {
  const result = simulate(scenario, { samples: 601 });
  if ("error" in result) throw new Error(result.error.message);
  return result;
}

const placeOf = ({ projectId, id: revisionId }: Revision) => ({ projectId, revisionId });
