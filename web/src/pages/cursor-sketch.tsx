import type { RunView } from "../features/evidence/run-view.ts";
import { BodySketch } from "../features/sketch/body-sketch.tsx";
import { useCursor, type Cursor } from "./cursor.ts";

/** The body sketch, moving with the time cursor. */
export function CursorSketch({ view, cursor }: { view: RunView; cursor: Cursor }) {
  const t = useCursor(cursor, view);
  return <BodySketch scenario={view.scenario} samples={view.samples} t={t} />;
}
