import type { LimitLine, Scenario, SweepPlan, TextbookBeside } from "@restband/solver";
import type { ReactNode } from "react";
import { PowerText } from "../../../components/power-text.tsx";
import { formatNumber } from "../../../format/format-number.ts";
import { say } from "../../../format/format-quantity.ts";
import { capitalised } from "../../../format/words.ts";
import { exploreField } from "../explore-field.ts";
import { isThick, lineName, sideWords } from "./line-names.ts";
import type { Shown } from "./shown.ts";
import type { SearchedLines } from "./use-limit-lines.ts";

interface MapNotesProps {
  found: SearchedLines;
  shown: Shown;
  plan: SweepPlan;
  scenario: Scenario;
}

/** What the lines of the map are, how they were found, and what the textbook says beside them. */
export function MapNotes({ found: { lines, left, textbook }, shown, plan, scenario }: MapNotesProps) {
  const [thick, thin] = [lines.filter(isThick), lines.filter((line) => !isThick(line))];
  if (lines.length === 0) return null;
  return (
    <dl className="mt-8 grid gap-x-12 gap-y-5 border-t border-line pt-4 desk:grid-cols-3">
      {thick.length > 0 && (
        <Note name="Thick line">
          {capitalised(lineName(thick[0], shown, scenario) ?? "")}, searched by runs between the cells to 0.1 %, not
          read off them.
        </Note>
      )}
      {thin.length > 0 && <Note name="Dashed line">{dashedWords(thin)}, searched likewise.</Note>}
      {shown.kind === "outcome" &&
        textbook.map((one) => (
          <Note key={one.key} name="Textbook">
            {textbookWords(one, plan, scenario)}
            <span className="block">
              <PowerText text={one.formula} /> · {one.source}
            </span>
          </Note>
        ))}
      {left > 0 && (
        <Note name="Left out">
          {formatNumber(left, 9)} more changes between cells are not searched: outcomes alternate too often.
        </Note>
      )}
    </dl>
  );
}

function Note({ name, children }: { name: string; children: ReactNode }) {
  return (
    <div>
      <dt className="text-15 font-semibold">{name}</dt>
      <dd className="mt-1 text-13 text-quiet">{children}</dd>
    </div>
  );
}

/** "Between sticks and slips and too short to tell". */
function dashedWords(lines: readonly LimitLine[]): string {
  const pairs = new Set(lines.map(({ between }) => `“${between.map(sideWords).sort().join("” and “")}”`));
  return `Between ${[...pairs].join("; between ")}`;
}

/** What the formula has at the last place of the line, and how far the search is from it at all of them. */
function textbookWords({ label, points, least, largest }: TextbookBeside, plan: SweepPlan, scenario: Scenario): string {
  const [across, up] = plan.axes.map(({ path }) => exploreField(scenario, path));
  if (!across || !up) return "";
  const point = points[points.length - 1];
  const at = `${say(point.up, up.measure)} of ${up.name} at ${say(point.across, across.measure)} of ${across.name}`;
  const off = Math.max(Math.abs(least), Math.abs(largest));
  const places = points.length === 1 ? "there" : `at the ${points.length} places compared`;
  return `${label}: ${at}. The line keeps within ${percent(off)} of it ${places}.`;
}

/** Rounded up, so that it is kept within. */
const percent = (share: number): string => `${formatNumber(Math.ceil(share * 1e4) / 100 || 0.01, 2)}\u00a0%`;
