import type { Computed } from "../compute/use-run.ts";
import { BodySketch } from "../features/sketch/body-sketch.tsx";
import { useCursor, viewOf, type Cursor } from "./cursor.ts";

/** The body sketch, moving with the time cursor; nothing where there is no motion to draw. */
export function CursorSketch({ computed, cursor }: { computed: Computed; cursor: Cursor }) {
  const view = viewOf(computed);
  const t = useCursor(cursor, view);
  return view && <BodySketch scenario={view.scenario} samples={view.samples} t={t} />;
}
