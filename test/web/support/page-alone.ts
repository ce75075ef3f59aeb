import { afterEach, beforeAll, beforeEach, vi } from "vitest";
import { editing } from "../../../web/src/features/statement/draft/editing-part.ts";

/*
 * To be imported before anything else by a test of a whole page: the solver in one thread, nothing drawn, and what a page
 * loads later loaded beforehand.
 */

// A whole page with the solver in one thread: seconds on a busy machine.
vi.setConfig({ testTimeout: 30_000 });

vi.mock("../../../web/src/compute/start-worker.ts", async () =>
  (await import("./scenario-page.tsx")).workerInOneThread(),
);
vi.mock("../../../web/src/components/plot.tsx", async () => (await import("./scenario-page.tsx")).plotWithoutDrawing());

// A person comes after it is loaded.
beforeAll(() => editing.ask());
beforeEach(() => localStorage.clear());
afterEach(() => vi.unstubAllGlobals());
