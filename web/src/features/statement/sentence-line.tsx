import { classNames } from "../../components/class-names.ts";
import { Icon } from "../../components/icon.tsx";
import { readInput } from "../../format/format-quantity.ts";
import { useDraftContext } from "./draft/draft-context.ts";
import { unitTyped } from "./entry/use-number-entry.ts";
import { measureOf, numberAt } from "./scenario-fields.ts";
import type { Piece, WordPiece } from "./sentence/piece.ts";

interface SentenceLineProps {
  pieces: readonly Piece[];
  /** Path of the value whose editor stands below. */
  openPath: string | null;
  onOpen: (path: string) => void;
  /** The whole form, for what a sentence cannot edit. */
  onAllFields: () => void;
}

/** One generated sentence: values and words are underlined and edited in place. */
export function SentenceLine({ pieces, openPath, onOpen, onAllFields }: SentenceLineProps) {
  return (
    <p className="max-w-[820px] text-18 leading-[1.85] desk:leading-[1.7]">
      {withSigns(pieces).map(({ piece, sign }, i) => (
        <PieceView key={keyOf(piece, i)} {...{ piece, sign, openPath, onOpen, onAllFields }} />
      ))}
    </p>
  );
}

/** A ± before a value stays with it, wherever the line ends. */
function withSigns(pieces: readonly Piece[]): { piece: Piece; sign: string }[] {
  const isSign = (piece: Piece | undefined): boolean => piece?.kind === "text" && piece.text.endsWith("±");
  return pieces.map((piece, i) => ({
    piece: piece.kind === "text" && isSign(piece) ? { ...piece, text: piece.text.slice(0, -1) } : piece,
    sign: isSign(pieces[i - 1]) ? "±" : "",
  }));
}

const keyOf = (piece: Piece, index: number): string =>
  piece.kind === "value" ? piece.path : `${index}${piece.kind === "word" ? piece.label : ""}`;

type PieceProps = Omit<SentenceLineProps, "pieces"> & { piece: Piece; sign: string };

function PieceView({ piece, sign, openPath, onOpen, onAllFields }: PieceProps) {
  switch (piece.kind) {
    case "text":
      return piece.text;
    case "word":
      return <Word piece={piece} />;
    case "off":
      return <Off piece={piece} />;
    case "rows":
      return (
        <button type="button" className={valueClass} onClick={onAllFields}>
          {piece.text}
        </button>
      );
    case "value":
      return <Value piece={piece} sign={sign} isOpen={openPath === piece.path} onOpen={() => onOpen(piece.path)} />;
  }
}

const valueClass =
  "font-semibold underline decoration-slip decoration-2 underline-offset-[5px] hover:decoration-[3px] rounded-[2px]";

interface ValueProps {
  piece: Extract<Piece, { kind: "value" }>;
  sign: string;
  isOpen: boolean;
  onOpen: () => void;
}

function Value({ piece: { path, field, word }, sign, isOpen, onOpen }: ValueProps) {
  const { draft } = useDraftContext();
  const { wanted, unread, units } = draft.sheet;
  const measure = measureOf(wanted, field);
  const number = numberAt(wanted, path);
  const reading =
    number === undefined ? null : readInput(number, measure, unitTyped(units[path], measure) ?? undefined);
  const isFaulty = draft.faults.some((fault) => fault.path === path);
  const shown = unread[path]?.text ?? word ?? reading?.text ?? "–";
  const unit = unread[path] || word ? "" : (reading?.unit ?? "");
  return (
    <span className="whitespace-nowrap">
      {sign}
      <button
        type="button"
        data-path={path}
        aria-expanded={isOpen}
        aria-label={`${field.label}: ${shown} ${unit}`.trim()}
        title={reading?.full}
        className={classNames(
          valueClass,
          !word && "figures text-[17px]",
          isOpen && "bg-slip px-1 text-on-slip no-underline forced-color-adjust-none",
          isFaulty && !isOpen && "text-broken decoration-broken decoration-wavy",
        )}
        onClick={onOpen}
      >
        {shown}
      </button>
      {unit && <span aria-hidden="true">{unit.startsWith("°") ? unit : ` ${unit}`}</span>}
    </span>
  );
}

/** What is out of force: struck through, said to be off, and brought back by one press. */
function Off({ piece }: { piece: Extract<Piece, { kind: "off" }> }) {
  const { dispatch } = useDraftContext();
  return (
    <>
      <s className="text-quiet">{piece.text}</s>{" "}
      <span className="text-15 whitespace-nowrap text-quiet">
        (off,{" "}
        <button type="button" className="link" onClick={() => dispatch(piece.switchOn)}>
          switch on
          <span className="sr-only">: {piece.text}</span>
        </button>
        )
      </span>
    </>
  );
}

/** A native select laid over its own word: the word wraps and is underlined like any other, the choice is the browser's. */
function Word({ piece }: { piece: WordPiece }) {
  const { dispatch } = useDraftContext();
  const shown = piece.text ?? piece.options.find(({ value }) => value === piece.value)?.label ?? piece.value;
  const word = (
    <span
      className={classNames(
        "relative inline-block rounded-[2px] focus-within:outline-2 focus-within:outline-offset-2 focus-within:outline-slip",
        piece.isMenu && "mx-0.5 px-1 align-middle text-quiet hover:text-slip",
      )}
    >
      <span aria-hidden="true" className={piece.isMenu ? "flex h-6 items-center" : valueClass}>
        {piece.isMenu ? <Icon name="dots" /> : shown}
      </span>
      <select
        aria-label={piece.label}
        title={piece.isMenu ? piece.label : undefined}
        className="absolute inset-0 w-full cursor-pointer appearance-none opacity-0"
        value={piece.value}
        onChange={(event) => dispatch(piece.choose(event.currentTarget.value))}
      >
        <Options options={piece.options} />
      </select>
    </span>
  );
  return piece.isBracketed ? <span className="whitespace-nowrap">({word})</span> : word;
}

function Options({ options }: { options: WordPiece["options"] }) {
  const groups = [...new Set(options.map(({ group }) => group))];
  return groups.map((group) => {
    const own = options
      .filter((option) => option.group === group)
      .map((option) => (
        <option key={option.value} value={option.value}>
          {option.label}
        </option>
      ));
    return group === undefined ? (
      own
    ) : (
      <optgroup key={group} label={group}>
        {own}
      </optgroup>
    );
  });
}
