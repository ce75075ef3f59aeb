/** Stands in every result; moves with `package.json` and `CHANGELOG.md` whenever any result moves. */
export const solverVersion = "0.3.0";
