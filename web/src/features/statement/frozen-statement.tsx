import type { Scenario } from "@restband/solver";
import { readInput } from "../../format/format-quantity.ts";
import { useOtherUnits } from "../../format/other-units.ts";
import { unitsEntered } from "./draft/open-draft.ts";
import { unitTyped } from "./entry/use-number-entry.ts";
import { groups, type Group } from "./groups.ts";
import { originsIn } from "./origin/origin-words.ts";
import { measureOf, numberAt } from "./scenario-fields.ts";
import type { Piece } from "./sentence/piece.ts";
import { plainText } from "./sentence/plain-text.ts";

/** What was asked, in the same five sentences, to be read and not changed; with where values come from. */
export function FrozenStatement({ scenario }: { scenario: Scenario }) {
  // Values entered in a unit beyond our own table are shown in it once that can be read.
  useOtherUnits();
  return groups.map((group) => <FrozenGroup key={group.key} group={group} scenario={scenario} />);
}

function FrozenGroup({ group, scenario }: { group: Group; scenario: Scenario }) {
  const origins = originsIn(scenario, group);
  const units = unitsEntered(scenario);
  return (
    <div
      role="group"
      aria-label={group.name}
      className="grid gap-x-4 border-line py-3 not-first:border-t desk:grid-cols-[116px_minmax(0,1fr)]"
    >
      <h3 className="pt-1 text-15 text-quiet">{group.name}</h3>
      <div className="min-w-0">
        <p className="max-w-[820px] text-18 leading-[1.85] desk:leading-[1.7]">
          {told(group.sentence(scenario)).map((piece, i) => (
            <FrozenPiece key={i} piece={piece} scenario={scenario} units={units} />
          ))}
        </p>
        {origins.length > 0 && (
          <ul
            className="mt-1.5 flex flex-wrap gap-x-2 gap-y-1.5"
            aria-label={`Where values of ${group.name} come from`}
          >
            {origins.map(({ path, text }) => (
              <li key={path} className="rounded border border-edge px-2 text-13 text-quiet">
                {text}
              </li>
            ))}
          </ul>
        )}
      </div>
    </div>
  );
}

/** What a sentence says, without the offer of more at its end. */
function told(pieces: readonly Piece[]): readonly Piece[] {
  const end = pieces.findIndex((piece) => piece.kind === "word" && piece.isOffer);
  return end < 0 ? pieces : pieces.slice(0, end);
}

interface FrozenPieceProps {
  piece: Piece;
  scenario: Scenario;
  units: Readonly<Record<string, string>>;
}

function FrozenPiece({ piece, scenario, units }: FrozenPieceProps) {
  if (piece.kind === "value" && piece.word === undefined) {
    const value = numberAt(scenario, piece.path);
    if (value === undefined) return "–";
    const measure = measureOf(scenario, piece.field);
    const entered = unitTyped(units[piece.path], measure) ?? undefined;
    const { text, unit, full } = readInput(value, measure, entered);
    return (
      <span className="whitespace-nowrap" title={full}>
        <span className="figures text-[17px] font-semibold">{text}</span>
        {unit && (unit.startsWith("°") ? unit : ` ${unit}`)}
      </span>
    );
  }
  const text = plainText(scenario, [piece], units);
  return piece.kind === "word" ? <span className="font-semibold">{text}</span> : text;
}
