import type { Scenario } from "@restband/solver";

/** The patterns the router knows, and how an address is made from each: every address of the page is spelled here. */
export const patterns = {
  signIn: "/sign-in",
  signUp: "/sign-up",
  welcome: "/welcome/:token",
  projects: "/projects",
  project: "/projects/:projectId",
  cases: "/projects/:projectId/cases",
  newScenario: "/projects/:projectId/scenarios/new",
  scenario: "/projects/:projectId/scenarios/:scenarioId",
  explore: "/projects/:projectId/scenarios/:scenarioId/explore",
  exploration: "/projects/:projectId/scenarios/:scenarioId/explore/:explorationId",
  revision: "/projects/:projectId/revisions/:revisionId",
  compare: "/projects/:projectId/compare",
  licences: "/licences",
} as const;

/** Name of the query parameter that carries the address to go back to after signing in. */
export const returnParameter = "return";

export const paths = {
  home: "/",
  signIn: (returnTo?: string) =>
    returnTo && returnTo !== "/"
      ? `${patterns.signIn}?${returnParameter}=${encodeURIComponent(returnTo)}`
      : patterns.signIn,
  signUp: patterns.signUp,
  projects: patterns.projects,
  project: (projectId: string) => `/projects/${projectId}`,
  /** A table of cases over a scenario, or over whichever is chosen there. */
  cases: (projectId: string, baseId?: string) => `/projects/${projectId}/cases${baseId ? `?base=${baseId}` : ""}`,
  newScenario: (projectId: string) => `/projects/${projectId}/scenarios/new`,
  scenario: (projectId: string, scenarioId: string) => `/projects/${projectId}/scenarios/${scenarioId}`,
  explore: (projectId: string, scenarioId: string) => `/projects/${projectId}/scenarios/${scenarioId}/explore`,
  exploration: (projectId: string, scenarioId: string, explorationId: string) =>
    `/projects/${projectId}/scenarios/${scenarioId}/explore/${explorationId}`,
  revision: (projectId: string, revisionId: string) => `/projects/${projectId}/revisions/${revisionId}`,
  /** Two things side by side, each told as `compareReference` spells it; without a second one it is chosen there. */
  compare: (projectId: string, first: string, second?: string) =>
    `/projects/${projectId}/compare?${new URLSearchParams({ a: first, ...(second === undefined ? {} : { b: second }) })}`,
  licences: patterns.licences,
};

/** How the address of a comparison names what it compares. */
export const compareReference = {
  scenario: (id: string) => `scenario:${id}`,
  revision: (id: string) => `revision:${id}`,
  /** A scenario that is stored nowhere, as a cell of a sweep: its whole content stands in the address. */
  given: (scenario: Scenario) => `given:${JSON.stringify(scenario)}`,
};

/** The address asked for before signing in, or the projects. Only an address of our own is followed. */
export function returnTarget(search: URLSearchParams): string {
  const asked = search.get(returnParameter);
  return asked && /^\/(?![/\\])/u.test(asked) ? asked : paths.projects;
}
