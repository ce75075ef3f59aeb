import type { Page } from "playwright-core";
import { expect } from "vitest";
import { editorOf, valueOf } from "./steps.ts";

/** What a person does to a page, finding everything by the words it bears. */
export interface Hands {
  /** A link or button. */
  readonly press: (page: Page, name: string) => Promise<void>;
  /** Types into an empty field. */
  readonly type: (page: Page, label: string, text: string) => Promise<void>;
  /** Opens a value of the statement, types another, and is done. */
  readonly change: (page: Page, label: string, text: string) => Promise<void>;
}

export const mouse: Hands = {
  press: (page, name) =>
    page
      .getByRole("button", { name, exact: true })
      .or(page.getByRole("link", { name, exact: true }))
      .first()
      .click(),
  type: async (page, label, text) => {
    await page.getByLabel(label, { exact: true }).click();
    await page.keyboard.type(text);
  },
  change: async (page, label, text) => {
    await valueOf(page, label).click();
    await editorOf(page, label).waitFor();
    await page.keyboard.type(text);
    await editorOf(page, label).getByRole("button", { name: "Done" }).click();
    await editorOf(page, label).waitFor({ state: "detached" });
  },
};

/** No pointer at all: Tab until the words are reached, Enter. */
export const keyboard: Hands = {
  press: async (page, name) => {
    await tabTo(page, (focus) => focus === name);
    await page.keyboard.press("Enter");
  },
  type: async (page, label, text) => {
    await tabTo(page, (focus) => focus === label);
    await page.keyboard.type(text);
  },
  change: async (page, label, text) => {
    await tabTo(page, (focus) => focus.startsWith(`${label}: `));
    await page.keyboard.press("Enter");
    await editorOf(page, label).waitFor();
    await page.keyboard.type(text);
    await page.keyboard.press("Enter");
    await editorOf(page, label).waitFor({ state: "detached" });
  },
};

/** More stops than a page has. */
const MOST = 150;

/** Presses Tab until the focus is on what bears the words, and sees that it shows. */
export async function tabTo(page: Page, isIt: (name: string) => boolean): Promise<void> {
  const passed: string[] = [];
  for (let presses = 0; presses < MOST; presses++) {
    const focus = await focused(page);
    if (isIt(focus)) {
      expect(await page.evaluate(() => document.activeElement?.matches(":focus-visible"))).toBe(true);
      return;
    }
    passed.push(focus);
    await page.keyboard.press("Tab");
  }
  throw new Error(`${MOST} presses of Tab come by these only: ${[...new Set(passed)].join(" · ")}`);
}

/** The name of what has the focus: its own, its label's, or its text. */
export const focused = (page: Page): Promise<string> =>
  page.evaluate(() => {
    const element = document.activeElement;
    if (!(element instanceof HTMLElement) || element === document.body) return "";
    const label = element instanceof HTMLInputElement ? element.labels?.[0] : undefined;
    return (element.getAttribute("aria-label") ?? label?.textContent ?? element.textContent ?? "").trim();
  });
