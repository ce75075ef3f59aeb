import * as createAccounts from "./20261201100000-create-accounts.ts";
import * as createSessions from "./20261201100100-create-sessions.ts";
import * as createThrottles from "./20261201100200-create-throttles.ts";
import * as createOneTimeLinks from "./20261201100300-create-one-time-links.ts";
import * as createProjects from "./20261201100400-create-projects.ts";
import * as createMembers from "./20261201100500-create-members.ts";
import * as createScenarios from "./20261201100600-create-scenarios.ts";
import * as createActivity from "./20261201100700-create-activity.ts";
import * as addScenarioTitles from "./20261201100800-add-scenario-titles.ts";
import * as addArchivedAt from "./20261201100900-add-archived-at.ts";
import * as chainActivity from "./20261201101000-chain-activity.ts";
import * as createRevisions from "./20261201101100-create-revisions.ts";
import * as createReplays from "./20261201101200-create-replays.ts";
import * as createReviewRequests from "./20261201101300-create-review-requests.ts";
import * as createDecisions from "./20261201101400-create-decisions.ts";
import * as createComments from "./20261201101500-create-comments.ts";
import * as createChecklists from "./20261201101600-create-checklists.ts";
import * as createNotices from "./20261201101700-create-notices.ts";
import * as addScenarioCreator from "./20261201101800-add-scenario-creator.ts";
import * as createExplorations from "./20261201102000-create-explorations.ts";
import * as addSwitchedOff from "./20261201103000-add-switched-off.ts";
import * as addAccountUnits from "./20261201103100-add-account-units.ts";
import * as createRecords from "./20261201104000-create-records.ts";
import * as createIdempotencyKeys from "./20261201105000-create-idempotency-keys.ts";

/** Every change of the database, in order. The names are recorded in it: never renamed, never edited once merged. */
export const migrations = [
  { name: "20261201100000-create-accounts", ...createAccounts },
  { name: "20261201100100-create-sessions", ...createSessions },
  { name: "20261201100200-create-throttles", ...createThrottles },
  { name: "20261201100300-create-one-time-links", ...createOneTimeLinks },
  { name: "20261201100400-create-projects", ...createProjects },
  { name: "20261201100500-create-members", ...createMembers },
  { name: "20261201100600-create-scenarios", ...createScenarios },
  { name: "20261201100700-create-activity", ...createActivity },
  { name: "20261201100800-add-scenario-titles", ...addScenarioTitles },
  { name: "20261201100900-add-archived-at", ...addArchivedAt },
  { name: "20261201101000-chain-activity", ...chainActivity },
  { name: "20261201101100-create-revisions", ...createRevisions },
  { name: "20261201101200-create-replays", ...createReplays },
  { name: "20261201101300-create-review-requests", ...createReviewRequests },
  { name: "20261201101400-create-decisions", ...createDecisions },
  { name: "20261201101500-create-comments", ...createComments },
  { name: "20261201101600-create-checklists", ...createChecklists },
  { name: "20261201101700-create-notices", ...createNotices },
  { name: "20261201101800-add-scenario-creator", ...addScenarioCreator },
  { name: "20261201102000-create-explorations", ...createExplorations },
  { name: "20261201103000-add-switched-off", ...addSwitchedOff },
  { name: "20261201103100-add-account-units", ...addAccountUnits },
  { name: "20261201104000-create-records", ...createRecords },
  { name: "20261201105000-create-idempotency-keys", ...createIdempotencyKeys },
];
