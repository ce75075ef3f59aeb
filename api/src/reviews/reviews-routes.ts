import type { Request } from "express";
import type { HandlersOf } from "../route-handler.ts";
import type { SessionsService } from "../sessions/sessions-service.ts";
import type { DecisionsService, Signer } from "./decisions-service.ts";
import type { ReviewsService } from "./reviews-service.ts";
import type { Actor } from "./standpoint.ts";

type Names =
  | "readReview"
  | "askForReview"
  | "decideRevision"
  | "selfCheckRevision"
  | "withdrawRevision"
  | "readChecklist"
  | "setChecklist";

export function reviewsRoutes(
  reviews: ReviewsService,
  decisions: DecisionsService,
  sessions: SessionsService,
): HandlersOf<Names> {
  const signer = ({ account, request }: Actor & { request: Request }): Signer => ({
    account,
    confirm: (password) => sessions.confirm(request, account, password),
  });
  return {
    readReview: (call) => reviews.read(call.params, call),
    askForReview: async (call) => {
      await reviews.ask(call.params, call.body, call);
      return reviews.read(call.params, call);
    },
    decideRevision: async (call) => {
      await decisions.decide(call.params, call.body, signer(call));
      return reviews.read(call.params, call);
    },
    selfCheckRevision: async (call) => {
      await decisions.selfCheck(call.params, call.body, signer(call));
      return reviews.read(call.params, call);
    },
    withdrawRevision: async (call) => {
      await decisions.withdraw(call.params, call.body, signer(call));
      return reviews.read(call.params, call);
    },
    readChecklist: ({ params }) => reviews.readChecklist(params.projectId),
    setChecklist: ({ params, body, account }) => reviews.setChecklist(params.projectId, body, account.id),
  };
}
