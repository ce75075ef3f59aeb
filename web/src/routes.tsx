import type { QueryClient } from "@tanstack/react-query";
import type { ComponentType } from "react";
import { createBrowserRouter, redirect, type LoaderFunctionArgs, type RouteObject } from "react-router-dom";
import { sessionQuery } from "./api/session.ts";
import { showUnitSystem } from "./format/unit-system.ts";
import { PageFallback } from "./pages/page-fallback.tsx";
import { RootLayout } from "./pages/root-layout.tsx";
import { RouteFailure } from "./pages/route-failure.tsx";
import { paths, patterns, returnTarget } from "./paths.ts";

/** A page that is loaded when it is first asked for, with its own failures. */
function page<Name extends string>(
  path: string,
  load: () => Promise<Record<Name, ComponentType>>,
  name: Name,
): RouteObject {
  return { path, lazy: async () => ({ Component: (await load())[name] }), ErrorBoundary: RouteFailure };
}

/** Every page of the product. A new one is one line here and one file in `pages/`. */
export function makeRouter(client: QueryClient) {
  return createBrowserRouter(makeRoutes(client));
}

export function makeRoutes(client: QueryClient): RouteObject[] {
  return [
    {
      Component: RootLayout,
      HydrateFallback: PageFallback,
      ErrorBoundary: RouteFailure,
      children: [
        { index: true, loader: () => redirect(paths.projects), Component: PageFallback },
        { loader: demandSession(client), ErrorBoundary: RouteFailure, children: workPages },
        { loader: passSession(client), ErrorBoundary: RouteFailure, children: entryPages },
        page(patterns.welcome, () => import("./pages/welcome-page.tsx"), "WelcomePage"),
        page(patterns.licences, () => import("./pages/licences-page.tsx"), "LicencesPage"),
        page("*", () => import("./pages/not-found-page.tsx"), "NotFoundPage"),
      ],
    },
  ];
}

const workPages = [
  page(patterns.projects, () => import("./pages/projects-page.tsx"), "ProjectsPage"),
  page(patterns.project, () => import("./pages/project-page.tsx"), "ProjectPage"),
  page(patterns.cases, () => import("./pages/project-cases-page.tsx"), "ProjectCasesPage"),
  page(patterns.newScenario, () => import("./pages/new-scenario-page.tsx"), "NewScenarioPage"),
  page(patterns.scenario, () => import("./pages/scenario-page.tsx"), "ScenarioPage"),
  page(patterns.explore, () => import("./pages/explore-page.tsx"), "ExplorePage"),
  page(patterns.exploration, () => import("./pages/exploration-page.tsx"), "ExplorationPage"),
  page(patterns.revision, () => import("./pages/revision-page.tsx"), "RevisionPage"),
  page(patterns.compare, () => import("./pages/compare-page.tsx"), "ComparePage"),
];

const entryPages = [
  page(patterns.signIn, () => import("./pages/sign-in-page.tsx"), "SignInPage"),
  page(patterns.signUp, () => import("./pages/sign-up-page.tsx"), "SignUpPage"),
];

/** Lets those through who are signed in; the others come back here after signing in. */
function demandSession(client: QueryClient) {
  return async ({ request }: LoaderFunctionArgs) => {
    const { account } = await client.ensureQueryData(sessionQuery);
    if (account) showUnitSystem(account.units);
    const { pathname, search, hash } = new URL(request.url);
    return account ? null : redirect(paths.signIn(pathname + search + hash));
  };
}

/** Whoever is signed in already goes on to where they wanted. */
function passSession(client: QueryClient) {
  return async ({ request }: LoaderFunctionArgs) => {
    const { account } = await client.ensureQueryData(sessionQuery);
    return account ? redirect(returnTarget(new URL(request.url).searchParams)) : null;
  };
}
