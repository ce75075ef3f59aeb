import type { Anchor } from "@restband/api/contract";
import { SelectField } from "../../components/select.tsx";
import { TextField } from "../../components/text-field.tsx";

/** A time as it is typed, s. */
export interface TypedAnchor {
  readonly kind: Anchor["kind"];
  readonly path: string;
  readonly t: string;
  readonly to: string;
}

export const wholeAnchor: TypedAnchor = { kind: "whole", path: "", t: "", to: "" };

/** An anchor as its fields show it. */
export function typedAnchor(anchor: Anchor, digits: number): TypedAnchor {
  const text = (t: number) => String(Number(t.toPrecision(digits)));
  if (anchor.kind === "instant") return { ...wholeAnchor, kind: "instant", t: text(anchor.t) };
  if (anchor.kind === "span") return { ...wholeAnchor, kind: "span", t: text(anchor.from), to: text(anchor.to) };
  return { ...wholeAnchor, ...anchor };
}

/** What was typed as an anchor; null where a time is no number or a field is not chosen. */
export function anchorOf({ kind, path, t, to }: TypedAnchor): Anchor | null {
  const [start, end] = [t, to].map((text) => (text.trim() === "" ? NaN : Number(text.replace(",", "."))));
  if (kind === "whole") return { kind };
  if (kind === "field") return path === "" ? null : { kind, path };
  if (kind === "instant") return start >= 0 ? { kind, t: start } : null;
  return start >= 0 && end >= 0 ? { kind, from: start, to: end } : null;
}

interface AnchorFieldProps {
  typed: TypedAnchor;
  fields: readonly { path: string; label: string }[];
  error?: string;
  onChange: (typed: TypedAnchor) => void;
}

const kinds = [
  { value: "whole", label: "the whole revision" },
  { value: "instant", label: "an instant" },
  { value: "span", label: "a span of time" },
  { value: "field", label: "a value" },
] as const;

/** What a comment is about: chosen here, or by a press or a drag on the time axis. */
export function AnchorField({ typed, fields, error, onChange }: AnchorFieldProps) {
  const { kind, path, t, to } = typed;
  return (
    <div className="flex flex-wrap items-start gap-x-4 gap-y-3">
      <SelectField
        label="About"
        choices={kinds}
        value={kind}
        error={kind === "whole" || kind === "field" ? error : undefined}
        onChange={(event) => onChange({ ...typed, kind: event.target.value as Anchor["kind"] })}
      />
      {kind === "field" && (
        <SelectField
          label="Value"
          choices={[
            { value: "", label: "choose one" },
            ...fields.map((field) => ({ value: field.path, label: field.label })),
          ]}
          value={path}
          onChange={(event) => onChange({ ...typed, path: event.target.value })}
        />
      )}
      {(kind === "instant" || kind === "span") && (
        <TextField
          label={kind === "span" ? "From" : "At"}
          className="w-32"
          isFigure
          hint="s"
          inputMode="decimal"
          value={t}
          error={error}
          onChange={(event) => onChange({ ...typed, t: event.target.value })}
        />
      )}
      {kind === "span" && (
        <TextField
          label="To"
          className="w-32"
          isFigure
          hint="s"
          inputMode="decimal"
          value={to}
          onChange={(event) => onChange({ ...typed, to: event.target.value })}
        />
      )}
    </div>
  );
}
