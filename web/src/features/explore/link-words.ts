import type { Links, Scenario } from "@restband/solver";
import { formatNumber } from "../../format/format-number.ts";
import { capitalised } from "../../format/words.ts";
import { exploreField } from "./explore-field.ts";

/** What follows what is varied, a sentence each: " Static friction is 1.25 times kinetic friction." */
export function linkWords(links: Links, scenario: Scenario): string {
  return Object.entries(links)
    .map(([path, link]) => {
      if ("keep" in link)
        return link.keep === "periods" ? " Each run lasts as many periods." : " The damping keeps its ratio.";
      const [name, of] = [path, link.of].map((each) => exploreField(scenario, each)?.name ?? each);
      return ` ${capitalised(name)} is ${formatNumber(link.factor, 4)} times ${of}.`;
    })
    .join("");
}
