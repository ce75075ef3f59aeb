import { Button } from "../../../components/button.tsx";
import { FieldError } from "../../../components/field.tsx";
import { Icon } from "../../../components/icon.tsx";
import { TextField } from "../../../components/text-field.tsx";
import type { Motion } from "../../../format/unit.ts";
import { FormulaForm } from "../formula/formula-form.tsx";
import { misplaced, nameOf } from "./compile-chain.ts";
import type { Kit } from "./kit.ts";
import type { Member } from "./part.ts";

interface MemberCardProps {
  member: Member;
  motion: Motion;
  kit: Kit;
  /** Null takes the member away. */
  onChange: (member: Member | null) => void;
}

/** One member: what it is called, what it is made of, and the formula with its numbers put in. */
export function MemberCard({ member, motion, kit, onChange }: MemberCardProps) {
  const formula = kit.members.find(({ key }) => key === member.formula);
  if (!formula) return null;
  const isMisplaced = formula.result.measure.motion !== motion;
  return (
    <div role="group" aria-label={nameOf(member)} className="rounded border border-edge bg-raised p-4">
      <div className="mb-4 flex items-start gap-3">
        <TextField
          label={formula.label}
          aria-label={`Name of ${formula.label}`}
          className="grow"
          value={member.name}
          onChange={(event) => onChange({ ...member, name: event.currentTarget.value })}
        />
        <Button kind="quiet" aria-label={`Take ${nameOf(member)} away`} onClick={() => onChange(null)}>
          <Icon name="cross" />
        </Button>
      </div>
      {isMisplaced && (
        <div className="mb-3">
          <FieldError>{misplaced(nameOf(member), motion)}</FieldError>
        </div>
      )}
      <FormulaForm
        formula={formula}
        entries={member.entries}
        onChange={(entries) => onChange({ ...member, entries })}
      />
    </div>
  );
}
