import { AxeBuilder } from "@axe-core/playwright";
import type { Page } from "playwright-core";

/** What axe finds on a page as it stands: each rule broken, with the elements that break it. */
export async function axeFindings(page: Page): Promise<string[]> {
  const { violations } = await new AxeBuilder({ page }).analyze();
  return violations.map(({ id, help, nodes }) => `${id}: ${help}: ${nodes.map(({ html }) => html).join(" ")}`);
}
