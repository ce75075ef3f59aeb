import { Suspense, useEffect, useRef } from "react";
import { Outlet, ScrollRestoration, useLocation } from "react-router-dom";
import { useHasSessionEnded } from "../api/session-end.ts";
import { Hatches } from "../components/hatches.tsx";
import { lazyPart } from "../components/lazy-part.ts";
import { StatusRegion } from "../components/status.tsx";
import { ConnectionLine } from "./connection-line.tsx";
import { PageFallback } from "./page-fallback.tsx";

// Loaded only when it is needed: its form is no part of the first paint.
const SignInAgain = lazyPart(async () => (await import("../features/account/sign-in-again.tsx")).SignInAgain);

/** What surrounds every page: the patterns, the announcements, the state of the connection. */
export function RootLayout() {
  const hasEnded = useHasSessionEnded();
  useFocusAfterNavigation();
  return (
    <>
      <a
        href="#content"
        className="sr-only focus:not-sr-only focus:fixed focus:top-2 focus:left-2 focus:z-50 focus:bg-paper focus:p-2"
      >
        Skip to the page
      </a>
      <Hatches />
      <ConnectionLine />
      <Suspense fallback={<PageFallback />}>
        <Outlet />
      </Suspense>
      <Suspense>{hasEnded && <SignInAgain />}</Suspense>
      <StatusRegion />
      <ScrollRestoration />
    </>
  );
}

/** Puts the focus at the new page, so that the next Tab starts there and screen readers begin to read it. */
function useFocusAfterNavigation(): void {
  const { pathname } = useLocation();
  const before = useRef(pathname);
  useEffect(() => {
    if (before.current === pathname) return;
    before.current = pathname;
    document.getElementById("content")?.focus({ preventScroll: true });
  }, [pathname]);
}
