import { useQueryErrorResetBoundary } from "@tanstack/react-query";
import { useEffect, type ReactNode } from "react";
import { isRouteErrorResponse, Link, useRevalidator, useRouteError } from "react-router-dom";
import { ApiFailure } from "../api/api-failure.ts";
import { useHasSessionEnded } from "../api/session-end.ts";
import { Button, ButtonLink } from "../components/button.tsx";
import { Mark } from "../components/mark.tsx";
import { paths } from "../paths.ts";

/** What a page shows in its place when it cannot be shown: nothing there, no server, signed out, or a fault of ours. */
export function RouteFailure() {
  const error = useRouteError();
  if (isNotFound(error)) return <NothingHere />;
  if (error instanceof ApiFailure && error.isUnreachable) return <Unreachable />;
  if (error instanceof ApiFailure && error.isSignedOut) return <SignedOut />;
  return <Broken />;
}

function isNotFound(error: unknown): boolean {
  return (isRouteErrorResponse(error) || error instanceof ApiFailure) && (error.status === 404 || error.status === 400);
}

/** A page of one sentence. */
function SentencePage({ title, children, action }: { title: string; children: ReactNode; action: ReactNode }) {
  return (
    <main id="content" tabIndex={-1} className="page-width grow py-14">
      <title>{`${title} · Restband`}</title>
      <Link to={paths.home} className="mb-12 inline-flex items-center gap-2.5 text-18 font-bold">
        <Mark />
        Restband
      </Link>
      <h1 className="text-34 font-semibold">{title}</h1>
      <div className="mt-4 mb-8 max-w-(--measure) text-18 text-quiet">{children}</div>
      {action}
    </main>
  );
}

/** An address that leads nowhere, or to something the person may not know of: the server says the same of both. */
export function NothingHere() {
  return (
    <SentencePage
      title="There is nothing at this address"
      action={
        <ButtonLink to={paths.projects} kind="primary">
          All projects
        </ButtonLink>
      }
    >
      <p>It may have been typed wrongly, or belong to a project you are not a member of.</p>
    </SentencePage>
  );
}

/** Asks again every few seconds, and at once by the button. */
function Unreachable() {
  const retry = useRetry();
  useEffect(() => {
    const timer = setInterval(retry, 5000);
    return () => clearInterval(timer);
  });
  return (
    <SentencePage
      title="The server does not answer"
      action={
        <Button kind="primary" onClick={retry}>
          Try now
        </Button>
      }
    >
      <p>This page tries again every 5 seconds. Nothing that was saved is lost.</p>
    </SentencePage>
  );
}

/** Waits behind the dialog that asks for the password. */
function SignedOut() {
  const hasEnded = useHasSessionEnded();
  const retry = useRetry();
  useEffect(() => {
    if (!hasEnded) retry();
  });
  return (
    <SentencePage title="Signed out" action={<Button onClick={retry}>Try again</Button>}>
      <p>The session has ended.</p>
    </SentencePage>
  );
}

function Broken() {
  return (
    <SentencePage
      title="This page has failed"
      action={
        <Button kind="primary" onClick={() => window.location.reload()}>
          Load it again
        </Button>
      }
    >
      <p>A fault in the page itself, or a newer version of it on the server. Nothing that was saved is lost.</p>
    </SentencePage>
  );
}

/** Forgets the failed answer and asks for everything on the page once more. */
function useRetry(): () => void {
  const { reset } = useQueryErrorResetBoundary();
  const { revalidate } = useRevalidator();
  return () => {
    reset();
    void revalidate();
  };
}
