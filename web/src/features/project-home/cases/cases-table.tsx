import { classNames } from "../../../components/class-names.ts";
import { FieldError } from "../../../components/field.tsx";
import { outcomeWords } from "../../../format/outcomes.ts";
import type { Glance } from "../glances/glance-book.ts";
import { LimitsLine } from "../limits-line.tsx";
import type { Case } from "./build-cases.ts";
import type { CaseField } from "./case-field.ts";
import { ColumnHead } from "./column-heads.tsx";
import type { Column, ColumnChoice } from "./columns.ts";

interface CasesTableProps {
  columns: readonly Column[];
  fields: readonly CaseField[];
  cases: readonly Case[];
  glances: readonly (Glance | undefined)[];
  onChoose: (column: number, choice: ColumnChoice) => void;
}

const cellClass = "px-2.5 py-1.5 text-left align-top";

/** The table as it is understood: columns, cells with their faults, and what each row would do. */
export function CasesTable({ columns, fields, cases, glances, onChoose }: CasesTableProps) {
  return (
    <div
      className="relative max-h-[560px] overflow-auto border-b border-edge"
      tabIndex={0}
      role="region"
      aria-label="Cases"
    >
      <table className="min-w-full border-collapse text-15">
        <thead className="sticky top-0 z-10 bg-paper">
          <tr className="border-b border-edge text-13">
            <th scope="col" className={classNames(cellClass, "pl-0 text-quiet")}>
              Line
            </th>
            {columns.map((column, i) => (
              <th key={i} scope="col" className={cellClass}>
                <ColumnHead column={column} fields={fields} onChoose={(choice) => onChoose(i, choice)} />
              </th>
            ))}
            <th scope="col" className={classNames(cellClass, "min-w-44")}>
              <span className="font-bold">What it does</span>
            </th>
          </tr>
        </thead>
        <tbody>
          {cases.map((each, i) => (
            <CaseRow key={each.line} columns={columns} each={each} glance={glances[i]} />
          ))}
        </tbody>
      </table>
    </div>
  );
}

function CaseRow({ columns, each, glance }: { columns: readonly Column[]; each: Case; glance: Glance | undefined }) {
  const faultsAt = (column: number | null) => each.faults.filter((fault) => fault.column === column);
  return (
    <tr className="border-b border-line">
      <th scope="row" className={classNames(cellClass, "figures pl-0 font-normal text-quiet")}>
        {each.line}
      </th>
      {columns.map((column, i) => (
        <td
          key={i}
          className={classNames(
            cellClass,
            column.kind === "unused" && "text-quiet line-through",
            faultsAt(i).length > 0 && "min-w-56 border-2 border-broken",
          )}
        >
          {each.cells[i] && <span className={column.kind === "field" ? "figures" : undefined}>{each.cells[i]}</span>}
          {!each.cells[i] && column.kind === "field" && <span className="text-quiet">as in the base</span>}
          {faultsAt(i).map(({ message }) => (
            <FieldError key={message}>{message}</FieldError>
          ))}
        </td>
      ))}
      <td className={classNames(cellClass, "text-13")}>
        {faultsAt(null).map(({ message }) => (
          <FieldError key={message}>{message}</FieldError>
        ))}
        {each.scenario && <Outcome glance={glance} />}
      </td>
    </tr>
  );
}

function Outcome({ glance }: { glance: Glance | undefined }) {
  if (!glance) return <span className="late text-quiet">computing</span>;
  const { computed } = glance;
  if (!computed) return <span className="text-quiet">{glance.failure}</span>;
  if ("refusal" in computed) return <span className="text-quiet">not computed by this version</span>;
  const { outcome, limits } = computed.result;
  return (
    <>
      <span className="block whitespace-nowrap">{outcome ? outcomeWords[outcome] : "no answer"}</span>
      <LimitsLine limits={limits} />
    </>
  );
}
