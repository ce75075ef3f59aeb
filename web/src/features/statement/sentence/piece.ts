import type { DraftAction } from "../draft/draft.ts";
import type { PathField } from "../scenario-fields.ts";

/** A part of a statement's sentence. */
export type Piece =
  | { kind: "text"; text: string }
  /** A number edited in place; `word` stands for it where a number would read badly ("at rest" for 0). */
  | { kind: "value"; path: string; field: PathField; word?: string }
  | WordPiece
  /** Rows of numbers, told in brief; edited in the full form. */
  | { kind: "rows"; path: string; label: string; text: string }
  /** What is kept but out of force; `switchOn` brings it back. */
  | { kind: "off"; text: string; switchOn: DraftAction };

/** A word that is one of several. `value` is the chosen option's; an empty one shows `text` alone and asks for a choice. */
export interface WordPiece {
  kind: "word";
  label: string;
  value: string;
  /** What stands in the sentence, where it is not the option's own label. */
  text?: string;
  /** Those of one `group` in a row stand together under its name. */
  options: readonly { value: string; label: string; group?: string }[];
  choose: (value: string) => DraftAction;
  /** Stands in brackets, kept together with them. */
  isBracketed?: boolean;
  /** Tells nothing and only offers more: left out with what follows it where the sentence is read and not edited. */
  isOffer?: boolean;
  /** No word of the sentence but a mark after one: what can be done to what it tells. */
  isMenu?: boolean;
}

export const text = (words: string): Piece => ({ kind: "text", text: words });
