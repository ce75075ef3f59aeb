import type { Scenario } from "@restband/solver";
import { useState } from "react";
import { Button } from "../../../components/button.tsx";
import { RadioChoices } from "../../../components/choices.tsx";
import { ErrorNote } from "../../../components/error-note.tsx";
import { FileButton } from "../../../components/file-button.tsx";
import { ProgressLine } from "../../../components/progress-line.tsx";
import { announce } from "../../../components/status.tsx";
import { TextArea } from "../../../components/text-field.tsx";
import { listed, sayMany } from "../../../format/words.ts";
import type { Glance } from "../glances/glance-book.ts";
import { fileNameOf, saveFile } from "../../../components/save-file.ts";
import type { Case, Decimal } from "./build-cases.ts";
import type { CaseField, WriteNumber } from "./case-field.ts";
import { CasesTable } from "./cases-table.tsx";
import type { Column } from "./columns.ts";
import { exampleTable } from "./example-table.ts";
import { useCaseGlances } from "./use-case-glances.ts";
import { useCases } from "./use-cases.ts";

interface CasesBoardProps {
  base: Scenario;
  fields: readonly CaseField[];
  write: WriteNumber;
  text: string;
  onText: (text: string) => void;
  /** Makes the scenarios, all or none; a rejection's message is shown and everything stays. */
  save: (scenarios: Scenario[]) => Promise<void>;
}

const decimalChoices: { value: Decimal; label: string; remark: string }[] = [
  { value: ",", label: "the comma", remark: "“1,200” is 1.2" },
  { value: ".", label: "the point", remark: "“1,200” is 1200" },
];

/** A table of cases over a base scenario: pasted, understood, computed, made into scenarios. */
export function CasesBoard({ base, fields, write, text, onText, save }: CasesBoardProps) {
  const table = useCases({ text, base, fields, write });
  const { cases, columns, faults } = table;
  const glances = useCaseGlances(cases);
  const [failure, setFailure] = useState<string | null>(null);
  return (
    <div className="flex flex-col gap-6">
      <TextArea
        label="Table"
        help="Paste it from a spreadsheet. The first row names the columns, a second one may give their units; each further row is a case. An empty cell leaves the number of the base."
        rows={8}
        spellCheck={false}
        wrap="off"
        value={text}
        onChange={(event) => onText(event.target.value)}
      />
      <div className="flex flex-wrap gap-3">
        <FileButton
          accept=".csv,.tsv,.txt,text/csv,text/tab-separated-values"
          most={5_000_000}
          onText={(next) => {
            setFailure(null);
            onText(next);
          }}
          onRefused={setFailure}
        >
          Choose a CSV file
        </FileButton>
        {text.trim() === "" && (
          <Button onClick={() => onText(exampleTable(base.title || "Untitled", fields))}>
            Begin with the numbers of the base
          </Button>
        )}
      </div>
      {failure && <ErrorNote>{failure}</ErrorNote>}
      {faults.map((fault) => (
        <ErrorNote key={fault}>{fault}</ErrorNote>
      ))}
      {table.isDecimalAsked && (
        <RadioChoices
          label="What parts the decimals"
          choices={decimalChoices}
          value={table.decimal ?? ("" as Decimal)}
          onChange={table.setDecimal}
        />
      )}
      {cases.length > 0 && (
        <>
          <LeftOut columns={columns} />
          <CasesTable columns={columns} fields={fields} cases={cases} glances={glances} onChoose={table.choose} />
          <CasesFoot
            base={base}
            cases={cases}
            columns={columns}
            glances={glances}
            hasTableFaults={faults.length > 0}
            save={save}
          />
        </>
      )}
    </div>
  );
}

/** Says which columns are not used: nothing is lost unseen. */
function LeftOut({ columns }: { columns: readonly Column[] }) {
  const heads = columns.flatMap(({ kind, head }) => (kind === "unused" && head !== "" ? [`“${head}”`] : []));
  if (heads.length === 0) return null;
  return <p>{`Left out: ${listed(heads)}. Choose under a head what it is for, to use it.`}</p>;
}

interface CasesFootProps {
  base: Scenario;
  cases: readonly Case[];
  columns: readonly Column[];
  glances: readonly (Glance | undefined)[];
  hasTableFaults: boolean;
  save: (scenarios: Scenario[]) => Promise<void>;
}

/** What stands in the way, how far the computing is, and the two ways on. */
function CasesFoot({ base, cases, columns, glances, hasTableFaults, save }: CasesFootProps) {
  const [isBusy, setBusy] = useState(false);
  const [failure, setFailure] = useState<string | null>(null);
  const faultCount = cases.reduce((sum, { faults }) => sum + faults.length, 0);
  const runnable = cases.filter(({ scenario }) => scenario).length;
  const done = glances.filter((glance) => glance !== undefined).length;
  const make = async () => {
    setBusy(true);
    setFailure(null);
    const failed = (error: unknown) => setFailure(error instanceof Error ? error.message : String(error));
    await save(cases.flatMap(({ scenario }) => scenario ?? [])).catch(failed);
    setBusy(false);
  };
  const saveResults = async () => {
    const { casesCsv } = await import("./cases-csv.ts");
    const name = fileNameOf(`${base.title} cases`, "csv");
    saveFile(name, "text/csv", casesCsv(columns, cases, glances));
    announce(`${name} is saved.`);
  };
  return (
    <div className="flex flex-col gap-4">
      {faultCount > 0 && (
        <p className="font-semibold text-broken">{`${sayMany(faultCount, "cell or row", "cells or rows")} to put right. Nothing is made until then.`}</p>
      )}
      {failure && <ErrorNote>{failure}</ErrorNote>}
      {done < runnable && (
        <ProgressLine label="Computing" fraction={done / runnable} remark={`${done} of ${runnable} cases`} />
      )}
      <div className="flex flex-wrap gap-3">
        {faultCount === 0 && !hasTableFaults && (
          <Button kind="primary" isBusy={isBusy} onClick={make}>
            {`Make ${sayMany(cases.length, "scenario")}`}
          </Button>
        )}
        {runnable > 0 && done === runnable && <Button onClick={saveResults}>Results as CSV</Button>}
      </div>
    </div>
  );
}
