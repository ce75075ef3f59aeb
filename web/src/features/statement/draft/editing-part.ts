import { laterPart } from "../../../later-part.ts";

/** Sentences and answer come first: what changes a draft (the check, the editor of a value) is loaded after them. */
export const editing = laterPart(() => import("./editing.ts"));
export type Editing = Awaited<ReturnType<typeof editing.ask>>;
