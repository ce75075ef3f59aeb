import { useId, useState, type FormEvent } from "react";
import { classNames } from "../../components/class-names.ts";
import { controlClass, FieldError } from "../../components/field.tsx";
import { readQuantity } from "../../format/format-quantity.ts";
import { unitFor } from "../../format/units.ts";
import type { SeenPart } from "./use-part.ts";
import { readSpan, seconds } from "./read-span.ts";

interface SpanFieldsProps {
  part: SeenPart;
  /** End of the whole run, s. */
  whole: number;
}

interface Typed {
  readonly from: string;
  readonly to: string;
}

/** The two ends of what is seen, which can be typed; what cannot be read changes nothing. */
export function SpanFields({ part, whole }: SpanFieldsProps) {
  const id = useId();
  const [typed, setTyped] = useState<Typed | null>(null);
  const [fault, setFault] = useState<string | null>(null);
  const unit = unitFor(whole, seconds);
  const shown = (t: number): string => readQuantity(t, seconds, { unit, digits: 5 }).text;
  const seen: Typed = { from: shown(part.range.from), to: shown(part.range.to) };
  const put = (change: Partial<Typed>): void => setTyped({ ...(typed ?? seen), ...change });
  const take = (event?: FormEvent): void => {
    event?.preventDefault();
    if (!typed) return;
    const read = readSpan(typed, seen, part.range, whole, unit);
    setFault("fault" in read ? read.fault : null);
    if ("fault" in read) return;
    part.span(read.from, read.to);
    setTyped(null);
  };
  const field = (end: keyof Typed, label: string) => (
    <input
      aria-label={label}
      aria-invalid={fault ? true : undefined}
      aria-describedby={fault ? id : undefined}
      autoComplete="off"
      inputMode="decimal"
      className={classNames(controlClass, "figures h-7! w-18! px-1.5! text-13! pointer-coarse:h-[44px]!")}
      value={(typed ?? seen)[end]}
      onChange={({ target }) => put({ [end]: target.value })}
      onBlur={() => take()}
    />
  );
  return (
    <form className="flex flex-wrap items-center gap-x-1.5" aria-label="Span" onSubmit={take}>
      <span className="text-quiet">from</span>
      {field("from", "Seen from")}
      <span className="text-quiet">to</span>
      {field("to", "Seen to")}
      <span className="text-quiet">{unit.label}</span>
      <button type="submit" className="sr-only">
        See this span
      </button>
      {fault && (
        <span className="basis-full">
          <FieldError id={id}>{fault}</FieldError>
        </span>
      )}
    </form>
  );
}
