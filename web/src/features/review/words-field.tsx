import type { Member } from "@restband/api/contract";
import { TextArea } from "../../components/text-field.tsx";
import { withMention } from "./comment-words.ts";

interface WordsFieldProps {
  label: string;
  words: string;
  /** Who can be told: members but oneself. */
  others: readonly Pick<Member, "accountId" | "name">[];
  error?: string;
  rows?: number;
  onChange: (words: string) => void;
}

/** What somebody has to say; a press on a name tells that person. */
export function WordsField({ label, words, others, error, rows = 3, onChange }: WordsFieldProps) {
  return (
    <div>
      <TextArea
        label={label}
        rows={rows}
        value={words}
        error={error}
        maxLength={4000}
        data-first-focus
        onChange={(event) => onChange(event.target.value)}
      />
      {others.length > 0 && (
        <p className="mt-1.5 flex flex-wrap items-baseline gap-x-3 gap-y-1 text-13 text-quiet">
          Tell
          {others.map(({ accountId, name }) => (
            <button
              key={accountId}
              type="button"
              className="link hit"
              onClick={() => onChange(withMention(words, name))}
            >
              @{name}
            </button>
          ))}
        </p>
      )}
    </div>
  );
}
