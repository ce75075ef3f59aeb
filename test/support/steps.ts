import type { Locator, Page } from "playwright-core";
import { expect } from "vitest";
import { password } from "./people.ts";

/** What is read on a page, its gaps made plain spaces. */
export async function textOf(locator: Locator): Promise<string> {
  return ((await locator.textContent()) ?? "").replace(/\s+/g, " ").trim();
}

/** Expects the text of something, waiting for it. */
export const expectText = (locator: Locator) => expect.poll(() => textOf(locator), { timeout: 15_000 });

/** The answer: the one sentence at the head of a scenario. */
export const answerOf = (page: Page): Locator => page.getByRole("heading", { level: 1 });

/** The state of saving, in the header. */
export const savingOf = (page: Page): Locator => page.getByRole("banner").getByRole("status");

/** A value in its sentence, which a press opens. */
export const valueOf = (page: Page, label: string): Locator =>
  page.getByRole("button", { name: new RegExp(`^${label}: `) });

export const editorOf = (page: Page, label: string): Locator => page.getByRole("group", { name: `Change ${label}` });

const metres: Readonly<Record<string, number>> = { m: 1, mm: 1e-3, μm: 1e-6 };

/** Expects the length beside the plots, at the cursor, under its name; m, a band's half width without its ±. */
export const expectLength = (page: Page, name: string) =>
  expect.poll(
    async () => {
      const text = await textOf(page.locator(`dt:text-is("${name}") + dd`));
      const [, figure, unit] = /^±?(.*?)([mμ]*)$/.exec(text) ?? [];
      return figureOf(figure) * metres[unit];
    },
    { timeout: 15_000 },
  );

export async function signIn(page: Page, email: string): Promise<void> {
  await page.goto("/");
  await page.getByLabel("E-mail").fill(email);
  await page.getByLabel("Password", { exact: true }).fill(password);
  await page.getByRole("button", { name: "Sign in" }).click();
  await page.getByRole("heading", { level: 1, name: /project/ }).waitFor();
}

/** From a project to a new scenario that starts from plain numbers. */
export async function beginScenario(page: Page): Promise<void> {
  await page.getByRole("main").getByRole("button", { name: "New scenario" }).click();
  const choices = page.getByRole("list", { name: "Starting points" }).getByRole("listitem");
  await choices.filter({ hasText: "Plain numbers" }).getByRole("button").click();
  await answerOf(page).waitFor();
}

/** From a project to one of its scenarios, by its row. */
export async function openScenario(page: Page, title: string): Promise<void> {
  await page.getByRole("heading", { name: title }).getByRole("link").click();
}

/** Opens a value of the sentence and types another. */
export async function change(page: Page, label: string, text: string): Promise<void> {
  await valueOf(page, label).click();
  await fill(page, label, text);
}

/** Types into the editor that is open and closes it. */
export async function fill(page: Page, label: string, text: string): Promise<void> {
  const editor = editorOf(page, label);
  await editor.getByRole("textbox", { name: label, exact: true }).fill(text);
  await editor.getByRole("button", { name: "Done" }).click();
  await editor.waitFor({ state: "detached" });
}

/** Chooses another word of a sentence. */
export async function choose(page: Page, label: string, word: string): Promise<void> {
  await page.getByRole("combobox", { name: label, exact: true }).selectOption({ label: word });
}

/** One row of the event table: what happened, when (s) and where (in the table's unit). */
export interface EventRow {
  readonly event: string;
  readonly time: number;
  readonly position: number;
}

/** Expects the first rows of the event table. */
export const expectEvents = (page: Page, count: number) =>
  expect.poll(async () => (await eventRows(page)).slice(0, count), { timeout: 15_000 });

/** A figure as the table prints it, to so many decimals. */
export const near = (figure: number, decimals: number): unknown => expect.closeTo(figure, decimals);

async function eventRows(page: Page): Promise<EventRow[]> {
  const rows = await page.locator("[aria-label=Events] tbody tr").evaluateAll((elements) =>
    elements.map((row) => ({
      event: row.querySelector("th button")?.textContent ?? "",
      cells: [...row.querySelectorAll("td")].map((cell) => cell.textContent ?? ""),
    })),
  );
  return rows.map(({ event, cells }) => ({ event, time: figureOf(cells[0]), position: figureOf(cells[1]) }));
}

/** A figure as it is printed: with narrow gaps and a true minus. */
const figureOf = (text: string): number => Number(text.replace(/\s/g, "").replace("\u2212", "-"));
