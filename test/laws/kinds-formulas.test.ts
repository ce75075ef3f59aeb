import { excitationTerms } from "@restband/solver";
import { expect, it } from "vitest";
import { formulas } from "../solver/excitation/formulas.ts";

it.each(excitationTerms.map((term) => term.kind))("%s is held against a formula of its own", (kind) => {
  expect(formulas.filter((formula) => formula.term.kind === kind)).not.toHaveLength(0);
});
