/** All of a draft that needs the solver's check of scenarios: the page loads it after its first paint. */
export { draftReducer, resumeDraft } from "./draft-reducer.ts";
export { readLocal } from "../saving/read-local.ts";
