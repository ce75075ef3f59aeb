import { PowerText } from "../../../components/power-text.tsx";
import { say, sayInput } from "../../../format/format-quantity.ts";
import { unitTyped, type Entries } from "./entries.ts";
import { piecesOf, type ExpressionPiece } from "./expression.ts";
import type { Formula, Given, Values } from "./formula.ts";

interface FormulaLineProps {
  formula: Formula;
  entries: Entries;
  /** Null while numbers are missing: the formula stands in symbols alone. */
  values: Values | null;
}

/** The formula in symbols, and below it with the numbers put in and what comes out. */
export function FormulaLine({ formula, entries, values }: FormulaLineProps) {
  const pieces = piecesOf(formula);
  const { symbol, measure } = formula.result;
  const isOneNumber = pieces.length === 1;
  return (
    <div className="text-13 text-quiet">
      {!isOneNumber && (
        <p>
          <Symbol text={symbol} /> = <Expression pieces={pieces} show={(given) => <Symbol text={given.symbol} />} />
        </p>
      )}
      {values && (
        <p className="mt-0.5">
          <Symbol text={symbol} /> ={" "}
          {!isOneNumber && (
            <>
              <Expression
                pieces={pieces}
                show={(given, isBase) => <Put given={given} isBase={isBase} entries={entries} values={values} />}
              />{" "}
              ={" "}
            </>
          )}
          <span className="font-semibold whitespace-nowrap text-ink">
            <PowerText text={say(formula.value(values), measure, { digits: 4 })} />
          </span>
        </p>
      )}
    </div>
  );
}

interface ExpressionProps {
  pieces: readonly ExpressionPiece[];
  show: (given: Given, isBase: boolean) => React.ReactNode;
}

function Expression({ pieces, show }: ExpressionProps) {
  return pieces.map((piece, i) => {
    if (piece.kind === "signs") return piece.text;
    if (piece.kind === "power") return <sup key={i}>{piece.text}</sup>;
    return <span key={i}>{show(piece.given, piece.isBase)}</span>;
  });
}

function Put({ given, isBase, entries, values }: { given: Given; isBase: boolean; entries: Entries; values: Values }) {
  const said = sayInput(values[given.key], given.measure, unitTyped(entries[given.key], given.measure));
  return (
    <span className="whitespace-nowrap">
      <PowerText text={isBase ? `(${said})` : said} />
    </span>
  );
}

/** A variable as it is set: slanted, what follows "_" below the line. */
export function Symbol({ text }: { text: string }) {
  const [name, below] = text.split("_");
  return (
    <span className="font-sym text-[1.08em]">
      <i>{name}</i>
      {below && <sub>{below}</sub>}
    </span>
  );
}
