import { useState } from "react";
import { formatNumber } from "../../../format/format-number.ts";
import { parseNumber } from "../../../format/parse-number.ts";
import type { Equivalent } from "./equivalents.ts";
import type { NumberEntry } from "./use-number-entry.ts";

/** The same value said another way: "or as damping ratio 0.0274". What cannot be read leaves the value alone. */
export function EquivalentEntry({ equivalent, entry }: { equivalent: Equivalent; entry: NumberEntry }) {
  const [typing, setTyping] = useState<string | null>(null);
  if (entry.value === undefined) return null;
  const type = (text: string): void => {
    setTyping(text);
    const read = parseNumber(text);
    if (read && "value" in read) entry.set(equivalent.to(read.value));
  };
  const shown = typing ?? formatNumber(equivalent.of(entry.value), 4);
  return (
    <label className="inline-flex items-baseline gap-1.5 whitespace-nowrap">
      <span>{equivalent.before}</span>
      <input
        type="text"
        autoComplete="off"
        className="figures hit border-b-2 border-slip bg-transparent px-1 font-semibold text-ink"
        style={{ width: `${Math.max(4, shown.length + 1)}ch` }}
        aria-label={`${equivalent.before.replace(/^or (as )?/, "") || "value"} ${equivalent.after}`.trim()}
        value={shown}
        onChange={(event) => type(event.currentTarget.value)}
        onBlur={() => setTyping(null)}
      />
      <span>{equivalent.after}</span>
    </label>
  );
}
