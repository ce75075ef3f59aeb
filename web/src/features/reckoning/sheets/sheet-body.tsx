import { useState } from "react";
import { Caution } from "../../../components/caution.tsx";
import { SelectField } from "../../../components/select.tsx";
import { readEntries, startEntries, type Entries } from "../formula/entries.ts";
import { FormulaForm } from "../formula/formula-form.tsx";
import { listed } from "../../../format/words.ts";
import type { ReckoningBodyProps } from "../reckoning-body.ts";
import { Outcome } from "../outcome.tsx";
import { sheetFor, type SheetKey } from "./index.ts";
import { takenFrom } from "./taken-from.ts";

/** One sheet: the way to the value, what it asks for, and what comes out. */
export function SheetBody({ reckoning, path, scenario, onTake, onClose }: ReckoningBodyProps) {
  const { ways, caution } = sheetFor[reckoning.key as SheetKey](scenario.motion);
  const [key, setKey] = useState(ways[0].key);
  const [typed, setTyped] = useState<Readonly<Record<string, Entries>>>({});
  const way = ways.find((each) => each.key === key) ?? ways[0];
  const entries = typed[way.key] ?? startEntries(way, scenario);
  const { values } = readEntries(way, entries);
  const also = (values && way.also?.(values)) ?? [];
  return (
    <div className="flex flex-col gap-5">
      {ways.length > 1 && (
        <SelectField
          label="Way to the value"
          choices={ways.map((each) => ({ value: each.key, label: each.label }))}
          value={key}
          onChange={(event) => setKey(event.currentTarget.value)}
          data-first-focus
        />
      )}
      <div>
        <FormulaForm formula={way} entries={entries} onChange={(next) => setTyped({ ...typed, [way.key]: next })} />
      </div>
      {values && way.remarks?.(values).map((remark) => <p key={remark}>{remark}</p>)}
      {caution && (
        <Caution>
          <p>{caution}</p>
        </Caution>
      )}
      <Outcome
        measure={way.result.measure}
        symbol={way.result.symbol}
        value={values && way.value(values)}
        range={(values && way.range?.(values)) ?? null}
        also={also.length > 0 ? `With it ${listed(also.map(({ words }) => words))}.` : undefined}
        onTake={() => values && onTake(takenFrom(way, path, values, entries))}
        onClose={onClose}
      />
    </div>
  );
}
