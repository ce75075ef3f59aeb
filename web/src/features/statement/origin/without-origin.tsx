import type { Scenario } from "@restband/solver";
import { useState, type RefObject } from "react";
import { sayMany, capitalised } from "../../../format/words.ts";
import { useDraftContext } from "../draft/draft-context.ts";
import { groups } from "../groups.ts";
import { numberAt } from "../scenario-fields.ts";

/** What the sentences show as numbers but nobody has said the origin of. */
export function pathsWithoutOrigin(scenario: Scenario): { path: string; label: string }[] {
  return groups
    .flatMap(({ sentence }) => sentence(scenario))
    .flatMap((piece) => (piece.kind === "value" && !piece.word ? piece : []))
    .filter(({ path }) => !scenario.origins[path] && !needsNone(scenario, path))
    .map(({ path, field }) => ({ path, label: field.label }));
}

/** Nothing, one face, one metre of radius, and how long a run is followed come from nowhere. */
function needsNone(scenario: Scenario, path: string): boolean {
  const value = numberAt(scenario, path);
  return value === 0 || (value === 1 && /\.(?:faces|radius)$/u.test(path)) || path.startsWith("span.");
}

/** A quiet list of the values without an origin, each a way to where it is edited. */
export function WithoutOrigin({ statement }: { statement: RefObject<HTMLElement | null> }) {
  const { draft } = useDraftContext();
  const [isOpen, setOpen] = useState(false);
  const missing = pathsWithoutOrigin(draft.sheet.wanted);
  if (missing.length === 0) return null;
  return (
    <div className="border-t border-line pt-3 text-13 text-quiet">
      <button type="button" className="link hit" aria-expanded={isOpen} onClick={() => setOpen(!isOpen)}>
        {capitalised(sayMany(missing.length, "value"))} without an origin
      </button>
      {isOpen && (
        <ul className="mt-2 flex flex-wrap gap-x-4 gap-y-1.5" aria-label="Values without an origin">
          {missing.map(({ path, label }) => (
            <li key={path}>
              <button type="button" className="link hit" onClick={() => show(statement.current, path)}>
                {label}
              </button>
            </li>
          ))}
        </ul>
      )}
    </div>
  );
}

/** Opens the value in its sentence, or goes to its field where the whole form stands open. */
function show(statement: HTMLElement | null, path: string): void {
  const place = statement?.querySelector<HTMLElement>(`[data-path="${CSS.escape(path)}"]`);
  place?.scrollIntoView({ block: "center" });
  if (place instanceof HTMLButtonElement) {
    if (place.getAttribute("aria-expanded") !== "true") place.click();
  } else place?.querySelector("input")?.focus();
}
