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
  licences: patterns.licences,
};

/** The address asked for before signing in, or the projects. Only an address of our own is followed. */
export function returnTarget(search: URLSearchParams): string {
  const asked = search.get(returnParameter);
  return asked && /^\/(?![/\\])/u.test(asked) ? asked : paths.projects;
}
