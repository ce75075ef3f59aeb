import { compareWithTextbook, type Result, type Scenario, type TextbookMismatch } from "@restband/solver";
import { Fragment, useId, useMemo, useState, type ReactNode } from "react";
import { classNames } from "../../components/class-names.ts";
import { PowerText } from "../../components/power-text.tsx";
import type { Reading } from "../../format/format-quantity.ts";
import { sayMany } from "../../format/words.ts";
import { FormulaText } from "./formula-text.tsx";
import { SmoothedVelocity } from "./smoothed-velocity.tsx";
import { mismatchGroups, symbolWords, textbookTable, type TextbookRow } from "./textbook-rows.ts";

/** Velocity of the smoothed law a reader's colleague may have used, until another is given: 1 mm/s between the faces. */
const usualVelocity = 1e-3;

/** Closed forms of the trade beside the run's own numbers, with their sources; and why the others have no place here. */
export function Textbook({ scenario, result }: { scenario: Scenario; result: Result }) {
  const [regularVelocity, setRegularVelocity] = useState(usualVelocity);
  const page = useMemo(
    () => compareWithTextbook(scenario, result, { regularVelocity }),
    [scenario, result, regularVelocity],
  );
  const { rows, sources } = useMemo(() => textbookTable(page.comparisons, scenario), [page, scenario]);
  const id = useId();
  return (
    <div className="min-w-0">
      <TableFrame isEmpty={rows.length === 0}>
        {rows.map((row) => (
          <Row key={row.key} row={row} sourceId={`${id}${row.source}`} />
        ))}
      </TableFrame>
      {rows.some(({ key }) => key === "regularised-creep") && (
        <SmoothedVelocity value={regularVelocity} onChange={setRegularVelocity} />
      )}
      {page.symbols.length > 0 && (
        <p className="mt-2 text-13 text-quiet">
          {symbolWords(page.symbols, scenario.motion).map((words, i) => (
            <Fragment key={words}>
              {i > 0 && ", "}
              <span className="whitespace-nowrap">
                <FormulaText text={words} />
              </span>
            </Fragment>
          ))}
        </p>
      )}
      {sources.length > 0 && (
        <ol className="mt-2 list-decimal pl-5 text-13 text-quiet" aria-label="Sources of the formulas">
          {sources.map((source, i) => (
            <li key={source} id={`${id}${i + 1}`}>
              <FormulaText text={`${source}.`} />
            </li>
          ))}
        </ol>
      )}
      <Mismatches mismatches={page.mismatches} />
    </div>
  );
}

const headClass = "pb-2 pl-4 text-right font-semibold whitespace-nowrap";

function TableFrame({ isEmpty, children }: { isEmpty: boolean; children: ReactNode }) {
  return (
    <div className="relative overflow-x-auto" tabIndex={0} role="region" aria-label="Textbook formulas beside this run">
      <table className="w-full">
        <caption className="sr-only">Textbook formulas beside this run</caption>
        <thead>
          <tr className="border-b border-edge text-13 text-quiet">
            <th scope="col" className="pb-2 text-left font-semibold">
              Textbook
            </th>
            <th scope="col" className={headClass}>
              formula
            </th>
            <th scope="col" className={headClass}>
              this run
            </th>
            <th scope="col" className={headClass}>
              run differs
            </th>
          </tr>
        </thead>
        <tbody>
          {isEmpty && (
            <tr>
              <td colSpan={4} className="py-1.5 text-quiet">
                No textbook formula holds for this scenario.
              </td>
            </tr>
          )}
          {children}
        </tbody>
      </table>
    </div>
  );
}

/** Notes of up to this many signs stand beside the formula, longer ones below it. */
const shortNote = 34;
const figureClass = "py-1.5 pl-4 text-right align-top whitespace-nowrap";

function Row({ row, sourceId }: { row: TextbookRow; sourceId: string }) {
  return (
    <tr className="border-b border-line">
      <th scope="row" className="min-w-44 py-1.5 text-left font-normal">
        {row.label}
        <br />
        <span className="text-13 text-quiet">
          <span className="font-sym italic">
            <FormulaText text={row.formula} />
          </span>{" "}
          <a href={`#${sourceId}`} className="link" aria-label={`Source ${row.source} of ${row.label}`}>
            [{row.source}]
          </a>
        </span>{" "}
        {row.note && (
          <span className={classNames("text-13 text-quiet", row.note.length > shortNote && "block")}>
            <FormulaText text={row.note} />
          </span>
        )}
      </th>
      <td className={figureClass}>
        <Figure reading={row.value} />
      </td>
      <td className={figureClass}>{row.ofRun ? <Figure reading={row.ofRun} /> : <NotTold />}</td>
      <td className={figureClass}>
        {row.difference === "" ? <NotTold /> : <span className="figures">{row.difference}</span>}
      </td>
    </tr>
  );
}

function Figure({ reading: { text, unit, full } }: { reading: Reading }) {
  return (
    <span title={full}>
      <span className="figures">
        <PowerText text={text} />
      </span>
      {unit && <span className="text-13 text-quiet"> {unit}</span>}
    </span>
  );
}

const NotTold = () => (
  <span className="text-quiet">
    <span aria-hidden="true">–</span>
    <span className="sr-only">not told</span>
  </span>
);

function Mismatches({ mismatches }: { mismatches: readonly TextbookMismatch[] }) {
  if (mismatches.length === 0) return null;
  return (
    <details className="mt-3">
      <summary className="hit w-fit content-center text-13 text-slip underline underline-offset-3">
        {sayMany(mismatches.length, "formula")} without a place here, and why
      </summary>
      <dl className="mt-1">
        {mismatchGroups(mismatches).map(({ reason, labels }) => (
          <div key={reason} className="border-b border-line py-2">
            <dt>{reason}</dt>
            <dd className="text-13 text-quiet">{labels.join(" · ")}</dd>
          </div>
        ))}
      </dl>
    </details>
  );
}
