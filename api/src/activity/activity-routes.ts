import type { HandlersOf } from "../route-handler.ts";
import type { ActivityService } from "./activity-service.ts";

export function activityRoutes(activity: ActivityService): HandlersOf<"listActivity"> {
  return {
    listActivity: ({ params, query }) => activity.list(params.projectId, query),
  };
}
