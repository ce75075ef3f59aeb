import { Link } from "react-router-dom";
import { PlainSelect, type Choice } from "../../components/select.tsx";
import type { ReactNode } from "react";
import type { SubjectReading } from "./compare-subject.ts";

interface SideHeadProps {
  /** "first", "second". */
  place: string;
  reference: string | null;
  choices: readonly Choice[];
  reading: SubjectReading;
  onChoose: (reference: string) => void;
  /** How it stands, where it is frozen. */
  mark: ReactNode;
  /** Its answer and motion. */
  children: ReactNode;
}

/** One side: which it is, how it stands, what it comes to. */
export function SideHead({ place, reference, choices, reading, onChoose, mark, children }: SideHeadProps) {
  const { subject, trouble } = reading;
  const isListed = choices.some(({ value }) => value === reference);
  const unlisted = subject ? `${subject.title}, given values` : "Choose what to compare";
  const all = isListed ? choices : [{ value: reference ?? "", label: unlisted }, ...choices];
  return (
    <div className="min-w-0">
      <PlainSelect
        aria-label={`The ${place} of the two`}
        choices={all}
        value={reference ?? ""}
        className="w-full max-w-[420px]"
        onChange={(event) => onChoose(event.currentTarget.value)}
      />
      {trouble && <p className="mt-3 text-broken">{trouble}</p>}
      {subject && (
        <>
          <p className="mt-3 flex flex-wrap items-baseline gap-x-3">
            {subject.to === null ? (
              <span className="font-bold">{subject.name}</span>
            ) : (
              <Link to={subject.to} className="link font-bold">
                {subject.name}
              </Link>
            )}
            {mark}
          </p>
          {children}
        </>
      )}
    </div>
  );
}
