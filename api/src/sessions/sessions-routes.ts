import { closeSession } from "../middleware/session.ts";
import type { HandlersOf } from "../route-handler.ts";
import type { SessionsService } from "./sessions-service.ts";

export function sessionsRoutes(sessions: SessionsService): HandlersOf<"readSession" | "signIn" | "signOut"> {
  return {
    readSession: ({ request }) => sessions.describe(request),

    signIn: async ({ body, request }) => {
      await sessions.signIn(request, body);
      return sessions.describe(request);
    },

    signOut: ({ request }) => closeSession(request),
  };
}
