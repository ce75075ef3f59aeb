import { pathsWithoutOrigin, type Scenario } from "@restband/solver";
import { useState, type RefObject } from "react";
import { sayMany, capitalised } from "../../../format/words.ts";
import { useDraftContext } from "../draft/draft-context.ts";
import { fieldAt } from "../scenario-fields.ts";

/** The values nobody has said the origin of, each as its field is called. */
export function withoutOrigin(scenario: Scenario): { path: string; label: string }[] {
  return pathsWithoutOrigin(scenario).map((path) => ({ path, label: fieldAt(scenario, path)?.label ?? path }));
}

/** A quiet list of the values without an origin, each a way to where it is edited. */
export function WithoutOrigin({ statement }: { statement: RefObject<HTMLElement | null> }) {
  const { draft } = useDraftContext();
  const [isOpen, setOpen] = useState(false);
  const missing = withoutOrigin(draft.sheet.wanted);
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
