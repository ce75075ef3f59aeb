import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { insertOneTimeLink } from "../../api/src/accounts/one-time-links-store.ts";
import { type Role, type RouteName, roles, routes } from "../../api/src/contract.ts";
import { permissions, permit } from "../../api/src/middleware/permit.ts";
import type { Browser, Request } from "../support/browser.ts";
import { cellsOf, createExploration, runner, smallSweep, sweepOf, tileContent } from "../support/explorations.ts";
import {
  addMember,
  createProject,
  createScenario,
  emailOf,
  password,
  signUp,
  smallScenario,
} from "../support/people.ts";
import {
  createComment,
  createRevision,
  decisionOn,
  freezeBody,
  smallComment,
  smallReplay,
} from "../support/revisions.ts";
import { startTestServer, type TestServer } from "../support/test-server.ts";

type Person = "anonymous" | "stranger" | Role | "administrator";

const people: readonly Person[] = ["anonymous", "stranger", ...roles, "administrator"];
const routeNames = Object.keys(routes) as RouteName[];

/** What `product.md`'s table says of each route, written out by hand and not taken from the code. */
const mayCall: Record<RouteName, readonly Person[]> = {
  signUp: people,
  claimAccount: people,
  changeAccount: ["stranger", "owner", "editor", "reviewer", "reader", "administrator"],
  readSession: people,
  signIn: people,
  signOut: people,
  listProjects: ["stranger", "owner", "editor", "reviewer", "reader", "administrator"],
  createProject: ["stranger", "owner", "editor", "reviewer", "reader", "administrator"],
  readProject: ["owner", "editor", "reviewer", "reader"],
  changeProject: ["owner"],
  archiveProject: ["owner"],
  restoreProject: ["owner"],
  listActivity: ["owner", "editor", "reviewer", "reader"],
  listMembers: ["owner", "editor", "reviewer", "reader"],
  addMember: ["owner"],
  changeMember: ["owner"],
  removeMember: ["owner"],
  listScenarios: ["owner", "editor", "reviewer", "reader"],
  createScenario: ["owner", "editor"],
  readScenario: ["owner", "editor", "reviewer", "reader"],
  saveScenario: ["owner", "editor"],
  readContents: ["owner", "editor", "reviewer", "reader"],
  createCases: ["owner", "editor"],
  duplicateScenario: ["owner", "editor"],
  moveScenario: ["owner", "editor"],
  archiveScenario: ["owner", "editor"],
  restoreScenario: ["owner", "editor"],
  readIntegrity: ["owner", "editor", "reviewer", "reader"],
  listRevisions: ["owner", "editor", "reviewer", "reader"],
  freezeScenario: ["owner", "editor"],
  readRevision: ["owner", "editor", "reviewer", "reader"],
  listReplays: ["owner", "editor", "reviewer", "reader"],
  keepReplay: ["owner", "editor", "reviewer", "reader"],
  readReview: ["owner", "editor", "reviewer", "reader"],
  askForReview: ["owner", "editor"],
  decideRevision: ["owner", "reviewer"],
  selfCheckRevision: ["owner", "editor"],
  withdrawRevision: ["owner"],
  readChecklist: ["owner", "editor", "reviewer", "reader"],
  setChecklist: ["owner"],
  listComments: ["owner", "editor", "reviewer", "reader"],
  addComment: ["owner", "editor", "reviewer"],
  replyToComment: ["owner", "editor", "reviewer"],
  settleComment: ["owner", "editor", "reviewer"],
  reopenComment: ["owner", "editor", "reviewer"],
  listNotices: ["stranger", "owner", "editor", "reviewer", "reader", "administrator"],
  closeNotice: ["stranger", "owner", "editor", "reviewer", "reader", "administrator"],
  listExplorations: ["owner", "editor", "reviewer", "reader"],
  createExploration: ["owner", "editor"],
  readExploration: ["owner", "editor", "reviewer", "reader"],
  claimExploration: ["owner", "editor"],
  releaseExploration: ["owner", "editor"],
  readTiles: ["owner", "editor", "reviewer", "reader"],
  saveTile: ["owner", "editor"],
  concludeExploration: ["owner", "editor"],
  deleteExploration: ["owner", "editor"],
};

let server: TestServer;
let accountIds: Record<string, string>;
beforeAll(async () => {
  const generous = { account: { attempts: 1000, seconds: 60 }, origin: { attempts: 1000, seconds: 60 } };
  server = await startTestServer({ throttle: generous });
  const names = ["owner", "editor", "reviewer", "reader", "second", "spare", "stranger", "foreign"];
  const signedUp = await Promise.all(names.map((name) => signUp(server, name)));
  accountIds = Object.fromEntries(names.map((name, i) => [name, signedUp[i].accountId]));
  await makeAdministrator();
});
afterAll(() => server.stop());

/**
 * A project with one of each role, a second owner, one more reader, and a scenario; and what the route is asked of: an
 * exploration with a tile, a revision that the editor froze with a comment, another project to move to.
 */
async function layProject(name: RouteName) {
  const arrive = ofSessions.has(name) ? signIn : stay;
  const names = ["owner", "editor", "reviewer", "reader", "stranger", "administrator"];
  const [owner, editor, reviewer, reader, stranger, administrator] = await Promise.all(names.map(arrive));
  const anonymous = await server.browser().open();
  const browsers: Record<Person, Browser> = { anonymous, stranger, owner, editor, reviewer, reader, administrator };
  const projectId = await createProject(owner);
  const scenario = await createScenario(owner, projectId);
  const { id: scenarioId } = scenario;
  for (const role of ["editor", "reviewer", "reader"] as const) await addMember(owner, projectId, emailOf(role), role);
  await addMember(owner, projectId, emailOf("second"), "owner");
  await addMember(owner, projectId, emailOf("spare"), "reader");
  const asks = (id: string) => routes[name].path.includes(`:${id}`);
  const revision = asks("revisionId") ? await createRevision(editor, projectId) : null;
  const own = {
    ...{ projectId, scenarioId, accountId: accountIds.spare },
    explorationId: asks("explorationId") ? await layExploration(owner, projectId, scenarioId) : crypto.randomUUID(),
    revisionId: revision?.id ?? crypto.randomUUID(),
    commentId: revision ? (await createComment(editor, revision)).id : crypto.randomUUID(),
  };
  return {
    browsers,
    params: { ...own, number: "0", noticeId: crypto.randomUUID() },
    scenario,
    revision,
    reviewerId: accountIds.reviewer,
    newcomer: emailOf("stranger"),
    toProjectId: name === "moveScenario" ? await layOtherProject(owner) : crypto.randomUUID(),
  };
}

/** Done as soon as its only tile is there. */
const oneTile = sweepOf(2);

async function layExploration(owner: Browser, projectId: string, scenarioId: string): Promise<string> {
  const { id: explorationId } = await createExploration(owner, projectId, scenarioId, oneTile);
  const body = { runner, content: tileContent(cellsOf(0, oneTile)) };
  await owner.get("saveTile", { params: { projectId, explorationId, number: "0" }, body });
  return explorationId;
}

async function layOtherProject(owner: Browser): Promise<string> {
  const projectId = await createProject(owner, "The other hall");
  await addMember(owner, projectId, emailOf("editor"), "editor");
  return projectId;
}

type Laid = Awaited<ReturnType<typeof layProject>>;

/** Routes that end a session or put another in its place: asked by people who sign in for them alone. */
const ofSessions = new Set<RouteName>(["signUp", "claimAccount", "signIn", "signOut"]);

const signIn = (name: string) => server.browser().signIn(emailOf(name), password);

const staying = new Map<string, Promise<Browser>>();

/** Somebody signed in, who stays so from one test to the next. */
function stay(name: string): Promise<Browser> {
  const browser = staying.get(name) ?? signIn(name);
  staying.set(name, browser);
  return browser;
}

async function makeAdministrator(): Promise<void> {
  const token = await insertOneTimeLink(server.database, { email: emailOf("administrator"), makesAdministrator: true });
  const browser = await server.browser().open();
  await browser.get("claimAccount", { body: { token, name: "Administrator", password } });
}

/** Lays anew what can be asked for once only. */
async function renew(name: RouteName, laid: Laid): Promise<void> {
  const { params, browsers } = laid;
  // What one of them moves away is no longer there for the next.
  if (name === "moveScenario" || name === "freezeScenario") {
    laid.scenario = await createScenario(browsers.owner, params.projectId);
    params.scenarioId = laid.scenario.id;
  }
  if (name === "deleteExploration")
    params.explorationId = (await createExploration(browsers.owner, params.projectId, params.scenarioId)).id;
  if (["askForReview", "decideRevision", "selfCheckRevision", "withdrawRevision"].includes(name)) {
    laid.revision = await createRevision(browsers.editor, params.projectId);
    params.revisionId = laid.revision.id;
  }
}

/** A request that is right in all but, perhaps, who sends it. */
function requestFor(
  name: RouteName,
  { newcomer, params, toProjectId, scenario, revision, reviewerId }: Omit<Laid, "browsers">,
): Request {
  switch (name) {
    case "signUp":
      return { body: { name: "New", email: `new-${crypto.randomUUID()}@workshop.example`, password } };
    case "claimAccount":
      return { body: { token: "a token that nobody ever gave out", name: "New", password } };
    case "signIn":
      return { body: { email: newcomer, password } };
    case "changeAccount":
      return { body: { units: "inch" } };
    case "createProject":
    case "changeProject":
      return { body: { name: "Changed", description: "" } };
    case "addMember":
      return { body: { email: newcomer, role: "reader" } };
    case "readContents":
      return { query: `?ids=${params.scenarioId}` };
    case "createCases":
      return { body: { contents: [smallScenario] } };
    case "duplicateScenario":
      return { body: { title: "Copy" } };
    case "moveScenario":
      return { body: { toProjectId } };
    case "createExploration":
      return { body: smallSweep };
    case "claimExploration":
      return { body: { runner, solverVersion: smallSweep.solverVersion } };
    case "releaseExploration":
      return { body: { runner } };
    case "readTiles":
      return { query: "?numbers=0" };
    case "saveTile":
      return { body: { runner, content: tileContent(cellsOf(0, oneTile)) } };
    case "concludeExploration":
      return { body: { headline: "Slides smoothly from 8.35 mm/s.", answer: {} } };
    case "changeMember":
      return { body: { role: "reviewer" } };
    case "freezeScenario":
      return { body: freezeBody(scenario), version: scenario.version };
    case "keepReplay":
      return { body: smallReplay };
    case "askForReview":
      return { body: { reviewers: [reviewerId], message: "" } };
    case "decideRevision":
      return { body: { decision: "return", ...decisionOn(revision!) } };
    case "selfCheckRevision":
      return { body: decisionOn(revision!) };
    case "withdrawRevision":
      return { body: { reasons: "Frozen by mistake.", password, digest: revision!.digest } };
    case "setChecklist":
      return { body: { points: ["Every value has its origin."] } };
    case "addComment":
      return { body: smallComment };
    case "replyToComment":
      return { body: { words: "Because the friction holds it.", mentions: [] } };
    case "createScenario":
      return { body: { content: smallScenario } };
    case "saveScenario":
      return { body: { content: smallScenario }, version: 1 };
    default:
      return {};
  }
}

/** Signed out: 401. No member: 404, as if there were nothing. A member whose role does not reach: 403. */
function statusFor(name: RouteName, person: Person): number {
  // A link that nobody gave out; work that the project's reviewer can look at.
  const refused: Partial<Record<RouteName, number>> = { claimAccount: 410, selfCheckRevision: 403 };
  if (mayCall[name].includes(person)) return refused[name] ?? routes[name].status;
  if (person === "anonymous") return 401;
  return person === "stranger" || person === "administrator" ? 404 : 403;
}

describe.each(routeNames)("%s", (name) => {
  it("does for each person what the table of roles says", async () => {
    const laid = await layProject(name);
    const { browsers, params } = laid;
    // Who may do it comes last: it changes what the others ask for.
    const order = [...people].sort((a, b) => Number(mayCall[name].includes(a)) - Number(mayCall[name].includes(b)));
    const seen: Record<string, number> = {};
    let version = 1;
    for (const person of order) {
      if (mayCall[name].includes(person)) await renew(name, laid);
      const asked = requestFor(name, laid);
      const request = { params, ...asked, version: name === "saveScenario" ? version : asked.version };
      seen[person] = (await browsers[person].call(name, request)).status;
      if (name === "saveScenario" && seen[person] === 200) version += 1;
    }
    expect(seen).toEqual(Object.fromEntries(people.map((person) => [person, statusFor(name, person)])));
  });
});

describe.each(routeNames.filter((name) => routes[name].path.includes(":projectId")))("%s", (name) => {
  it("gives nothing of one project to the owner of another, not even that it exists", async () => {
    const laid = await layProject(name);
    const { params } = laid;
    const owner = await stay("foreign");
    const projectId = await createProject(owner);
    const request = requestFor(name, laid);
    const theirs = await owner.call(name, { params, ...request });
    const none = await owner.call(name, { params: { ...params, projectId: crypto.randomUUID() }, ...request });
    expect([theirs.status, theirs.body]).toEqual([404, none.body]);
    // Under one's own project, with the ids of the other.
    if (/:(scenarioId|accountId|explorationId|revisionId)/.test(routes[name].path)) {
      expect((await owner.call(name, { params: { ...params, projectId }, ...request })).status).toBe(404);
    }
  });
});

describe("an archived project", () => {
  /** What goes on working: reading, taking it out again, and going. */
  const stays = new Set<RouteName>(["archiveProject", "restoreProject", "removeMember"]);

  it.each(routeNames.filter((name) => routes[name].path.includes(":projectId")))("%s", async (name) => {
    const laid = await layProject(name);
    const { owner } = laid.browsers;
    await owner.get("archiveProject", { params: laid.params });
    const request = { params: laid.params, ...requestFor(name, laid) };
    const answer = await owner.call<{ error: { code: string } }>(name, request);
    const isOpen = routes[name].method === "GET" || stays.has(name);
    expect(answer.status).toBe(isOpen ? routes[name].status : 409);
    if (!isOpen) expect(answer.body.error.code).toBe("archived");
  });
});

describe("the role table", () => {
  it("has an entry for every route, or the server does not start", () => {
    expect(Object.keys(permissions).sort()).toEqual([...routeNames].sort());
    expect(() => permit("forgotten" as RouteName, () => Promise.resolve(null))).toThrow(/forgotten has no entry/);
  });

  it("says what is missing where a role does not reach", async () => {
    const { browsers, params } = await layProject("saveScenario");
    const { message } = await browsers.reader.fail("saveScenario", {
      params,
      body: { content: smallScenario },
      version: 1,
    });
    expect(message).toBe("Your role in this project is reader; this takes owner or editor.");
  });
});
