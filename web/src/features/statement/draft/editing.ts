/** All that changes a draft, the solver's check of scenarios with it: the page loads it after its first paint. */
export { draftReducer, resumeDraft } from "./draft-reducer.ts";
export { readLocal } from "../saving/read-local.ts";
export { ValueEditor } from "../entry/value-editor.tsx";
