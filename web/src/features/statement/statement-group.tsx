import type { Fault } from "@restband/solver";
import { Suspense, use, useEffect, useId, useRef, useState, type ComponentProps } from "react";
import { Button } from "../../components/button.tsx";
import { FieldError } from "../../components/field.tsx";
import { lazyPart } from "../../components/lazy-part.ts";
import { sayMany } from "../../format/words.ts";
import { useDraftContext } from "./draft/draft-context.ts";
import { editing, type Editing } from "./draft/editing-part.ts";
import { faultsIn, type Group } from "./groups.ts";
import { Keeps } from "./keeps.tsx";
import { fieldAt } from "./scenario-fields.ts";
import { originsIn } from "./origin/origin-words.ts";
import { remarkWords } from "./remark-words.ts";
import type { Piece } from "./sentence/piece.ts";
import { SentenceLine } from "./sentence-line.tsx";

// Sentences come first; a form is loaded when it is first opened.
const GroupForm = lazyPart(async () => (await import("./form/group-form.tsx")).GroupForm);

interface StatementGroupProps {
  group: Group;
  /** What this version cannot do with it. */
  remarks: readonly Fault[];
}

/** One group: its sentence, or its whole form in the sentence's place. */
export function StatementGroup({ group, remarks }: StatementGroupProps) {
  const { draft } = useDraftContext();
  const [isForm, setForm] = useState(false);
  const formId = useId();
  const faults = faultsIn(draft.faults, group);
  const toggle = useRef<HTMLButtonElement>(null);
  const close = (): void => {
    setForm(false);
    toggle.current?.focus();
  };
  return (
    <div
      role="group"
      aria-label={group.name}
      className="grid grid-cols-[minmax(0,1fr)_auto] gap-x-4 border-line py-3 not-first:border-t desk:grid-cols-[116px_minmax(0,1fr)_auto]"
    >
      <h3 className="pt-1 text-15 text-quiet">{group.name}</h3>
      <div className="min-w-0 max-desk:order-last max-desk:col-span-2">
        {isForm ? (
          <div id={formId}>
            <Suspense>
              <GroupForm group={group} />
            </Suspense>
            <div className="mt-5 flex flex-wrap items-center gap-4">
              <Button onClick={close}>Back to the sentence</Button>
              {faults.length > 0 && <ToPutRight count={faults.length} />}
            </div>
          </div>
        ) : (
          <SentenceWithEditor group={group} faults={faults} onAllFields={() => setForm(true)} />
        )}
        <Origins group={group} />
        {remarks.map((remark) => (
          <p key={remark.path} className="mt-2 max-w-(--measure) text-15 text-quiet">
            {remarkWords(draft.inForce, remark)}
          </p>
        ))}
      </div>
      <button
        ref={toggle}
        type="button"
        className="link hit self-start text-13"
        aria-expanded={isForm}
        aria-controls={isForm ? formId : undefined}
        onClick={() => setForm(!isForm)}
      >
        {isForm ? "the sentence" : "all fields"} <span className="sr-only">of {group.name}</span>
      </button>
    </div>
  );
}

/** Where values come from, quietly. */
function Origins({ group }: { group: Group }) {
  const { draft } = useDraftContext();
  const origins = originsIn(draft.sheet.wanted, group);
  if (origins.length === 0) return null;
  return (
    <ul className="mt-1.5 flex flex-wrap gap-x-2 gap-y-1.5" aria-label={`Where values of ${group.name} come from`}>
      {origins.map(({ path, text }) => (
        <li key={path} className="rounded border border-edge px-2 text-13 text-quiet">
          {text}
        </li>
      ))}
    </ul>
  );
}

export function ToPutRight({ count }: { count: number }) {
  return (
    <p className="text-13 font-semibold text-broken">{sayMany(count, "field").replace(/^one/, "1")} to put right</p>
  );
}

interface SentenceProps {
  group: Group;
  faults: readonly Fault[];
  onAllFields: () => void;
}

function SentenceWithEditor({ group, faults, onAllFields }: SentenceProps) {
  const { draft } = useDraftContext();
  const [open, setOpen] = useState<{ path: string; nib: number } | null>(null);
  const place = useRef<HTMLDivElement>(null);
  const { wanted, off } = draft.sheet;
  const pieces = group.sentence(wanted, off);
  const field = open && fieldAt(wanted, open.path);

  const nibOf = (path: string): number => {
    const button = place.current?.querySelector(`[data-path="${CSS.escape(path)}"]`);
    if (!button || !place.current) return 0;
    const box = button.getBoundingClientRect();
    return box.left + box.width / 2 - place.current.getBoundingClientRect().left;
  };
  const openAt = (path: string): void => setOpen(open?.path === path ? null : { path, nib: nibOf(path) });
  const focusOn = (path: string): void =>
    place.current?.querySelector<HTMLElement>(`[data-path="${CSS.escape(path)}"]`)?.focus();
  const close = (): void => {
    setOpen(null);
    if (open) focusOn(open.path);
  };
  useNewValue(pieces, openAt, focusOn);
  return (
    <div ref={place}>
      <SentenceLine pieces={pieces} openPath={open?.path ?? null} onOpen={openAt} onAllFields={onAllFields} />
      {open && field && (
        <Suspense>
          <Editor key={open.path} path={open.path} field={field} nib={open.nib} onClose={close} />
        </Suspense>
      )}
      {faults.map(
        (fault) =>
          fault.path !== open?.path && <SentenceFault key={fault.path + fault.message} fault={fault} onOpen={openAt} />,
      )}
    </div>
  );
}

/**
 * A limit or term that has just been added is waiting for its numbers: its first value opens by itself. One that was
 * switched on again has them: its first value has the focus, in place of the button that is gone.
 */
function useNewValue(pieces: readonly Piece[], open: (path: string) => void, focus: (path: string) => void): void {
  const paths = pieces.flatMap((piece) => (piece.kind === "value" ? piece.path : []));
  const offs = pieces.filter(({ kind }) => kind === "off").length;
  const known = useRef({ paths, offs });
  useEffect(() => {
    const before = known.current;
    known.current = { paths, offs };
    const added = paths.filter((path) => !before.paths.includes(path));
    const isOnlyMore = before.paths.every((path) => paths.includes(path));
    if (!isOnlyMore || !added.some((path) => path.includes("["))) return;
    if (offs < before.offs) focus(added[0]);
    else open(added[0]);
  });
}

function SentenceFault({ fault, onOpen }: { fault: Fault; onOpen: (path: string) => void }) {
  const { draft } = useDraftContext();
  const field = fieldAt(draft.sheet.wanted, fault.path);
  return (
    <FieldError>
      {fault.message} <Keeps path={fault.path} />{" "}
      {field && (
        <button type="button" className="link" onClick={() => onOpen(fault.path)}>
          put it right
        </button>
      )}
    </FieldError>
  );
}

/** The editor of a value, loaded after the first paint: at once where it is there by now. */
function Editor(props: ComponentProps<Editing["ValueEditor"]>) {
  const { ValueEditor } = editing.now() ?? use(editing.ask());
  return <ValueEditor {...props} />;
}
