import { withField, type Scenario } from "@restband/solver";
import { Button } from "../../../components/button.tsx";
import { DataTable } from "../../../components/data-table.tsx";
import { PowerText } from "../../../components/power-text.tsx";
import { formatNumber } from "../../../format/format-number.ts";
import { say } from "../../../format/format-quantity.ts";
import { fromSi, toSi } from "../../../format/unit.ts";
import { unitFor } from "../../../format/units.ts";
import type { ExploreFrame } from "../explore-frame.ts";
import { exploreField, theBody, type ExploreField } from "../explore-field.ts";
import { roundedTo } from "../say-value.ts";
import type { FlipReading, ThresholdReading } from "./threshold-reading.ts";
import { safeValue, sayThreshold } from "./threshold-words.ts";

interface ThresholdAnswerProps extends ExploreFrame {
  reading: ThresholdReading;
}

/** What a search found: the value on the safe side, the bracket as run, the formula beside it. */
export function ThresholdAnswer({ reading, scenario, open }: ThresholdAnswerProps) {
  const field = exploreField(scenario, reading.path);
  if (!field) return <p className="text-quiet">The scenario has no such number any more.</p>;
  const { headline, lead } = sayThreshold(reading, field, theBody(scenario));
  const { answer, safeSide } = reading;
  return (
    <div>
      <p className="max-w-[860px] text-24 font-semibold">{headline}</p>
      {lead.map((line) => (
        <p key={line} className="mt-2 max-w-(--measure) text-18 text-quiet">
          {line}
        </p>
      ))}
      {answer && safeSide && open && (
        <Button
          className="mt-4"
          onClick={() => {
            const value = safeValue(answer, safeSide, field);
            return open(atSafeValue(scenario, field, answer, safeSide), `${field.name} ${value}`);
          }}
        >
          Make a scenario at {safeValue(answer, safeSide, field)}
        </Button>
      )}
      {reading.analytic.length > 0 && <Analytic reading={reading} field={field} />}
    </div>
  );
}

/** The scenario with the value that was said. */
function atSafeValue(scenario: Scenario, field: ExploreField, flip: FlipReading, side: "above" | "below"): Scenario {
  const value = side === "above" ? flip.above.value : flip.below.value;
  const unit = unitFor(value, field.measure);
  const rounded = roundedTo(fromSi(value, unit), 4, side === "above" ? "up" : "down");
  return withField(scenario, field.path, toSi(rounded, unit));
}

function Analytic({ reading, field }: { reading: ThresholdReading; field: ExploreField }) {
  return (
    <DataTable
      className="mt-5 max-w-[720px]"
      caption="The same by formula"
      isCaptionShown
      rows={reading.analytic}
      keyOf={({ key }) => key}
      columns={[
        {
          key: "formula",
          head: "Textbook",
          cell: ({ label, formula, source }) => (
            <span className="whitespace-normal">
              {label}
              <span className="block text-13 text-quiet">
                <PowerText text={formula} /> · {source}
              </span>
            </span>
          ),
        },
        {
          key: "value",
          head: "formula",
          isFigure: true,
          cell: ({ value }) => say(value, field.measure, { digits: 4 }),
        },
        {
          key: "difference",
          head: "the search differs",
          isFigure: true,
          cell: ({ difference }) => (difference === null ? "–" : differenceWords(difference)),
        },
      ]}
    />
  );
}

/** A bracket is a ten-thousandth wide: below a thousandth of a percent there is nothing to tell. */
const differenceWords = (difference: number): string =>
  Math.abs(difference) < 1e-5 ? "under 0.001 %" : `${formatNumber(100 * difference, 2)} %`;
