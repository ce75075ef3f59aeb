import type { HandlersOf } from "../route-handler.ts";
import type { CommentsService } from "./comments-service.ts";

type Names = "listComments" | "addComment" | "replyToComment" | "settleComment" | "reopenComment";

export function commentsRoutes(comments: CommentsService): HandlersOf<Names> {
  return {
    listComments: ({ params }) => comments.list(params),
    addComment: ({ params, body, account }) => comments.add(params, body, account.id),
    replyToComment: ({ params, body, account }) => comments.reply(params, body, account.id),
    settleComment: ({ params, account }) => comments.settle(params, account.id),
    reopenComment: ({ params, account }) => comments.reopen(params, account.id),
  };
}
