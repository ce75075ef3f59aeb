import type { HandlersOf } from "../route-handler.ts";
import type { NoticesService } from "./notices-service.ts";

export function noticesRoutes(notices: NoticesService): HandlersOf<"listNotices" | "closeNotice"> {
  return {
    listNotices: ({ account }) => notices.list(account.id),
    closeNotice: ({ params, account }) => notices.close(account.id, params.noticeId),
  };
}
