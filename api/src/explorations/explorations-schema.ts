import { z, type Scenario } from "@restband/solver";

/** `search`: a threshold and its cures; `sweep`: a grid of cells; `study`: seeded random draws. */
export const explorationKinds = ["search", "sweep", "study"] as const;
export type ExplorationKind = (typeof explorationKinds)[number];

/** Cells of an exploration, and the bytes of one tile: a request stays below 1 MB with its bytes as base64. */
export const mostCells = 250_000;
export const mostTileBytes = 720_000;
export const mostTileCells = 4096;
/** Characters of a plan or an answer as JSON. */
const mostText = 300_000;
/** Tiles of one reading. */
export const mostTilesRead = 6;

const json = z
  .record(z.string(), z.unknown())
  .refine((value) => JSON.stringify(value).length <= mostText, `No more than ${mostText} characters of JSON.`);

/** What the result consists of: tiles of so many cells each, a row of `cellValues` numbers for a cell. None for a search. */
const gridShape = {
  tileCells: z.array(z.int().min(1).max(mostTileCells)).max(2500),
  cellValues: z.int().min(1).max(100),
};

/** What the answer says in a sentence, and all of it for the page that asked. */
export const conclusionSchema = z.strictObject({ headline: z.string().max(400), answer: json });

export const explorationDraftSchema = z
  .strictObject({
    kind: z.enum(explorationKinds),
    /** What is asked, in a line of a list. */
    title: z.string().min(1).max(200),
    /** The version of the scenario it is asked of: no other is stored with it. */
    scenarioVersion: z.int().min(1),
    solverVersion: z.string().min(1).max(40),
    plan: json,
    ...gridShape,
    /** Where it is answered already. */
    conclusion: conclusionSchema.optional(),
  })
  .refine(({ kind, conclusion }) => kind === "search" || conclusion === undefined, {
    path: ["conclusion"],
    message: "Only a search is answered before its cells are there.",
  })
  .refine(({ tileCells }) => countOf(tileCells) <= mostCells, {
    path: ["tileCells"],
    message: `No more than ${mostCells} cells.`,
  })
  .refine(({ tileCells, cellValues }) => Math.max(0, ...tileCells) * cellValues * 8 <= mostTileBytes, {
    path: ["tileCells"],
    message: `A tile has no more than ${mostTileBytes} bytes.`,
  });

const countOf = (tileCells: readonly number[]): number => tileCells.reduce((sum, cells) => sum + cells, 0);

/** Whoever computes: a page, by an id it has made for itself. One at a time holds an exploration. */
export const runnerSchema = z.strictObject({ runner: z.uuid() });

export const claimExplorationSchema = runnerSchema.extend({ solverVersion: z.string().min(1).max(40) });

/** One tile: rows of little-endian Float64, base64. */
export const tileSchema = z.strictObject({ number: z.int().min(0), content: z.base64() });
export type StoredTile = z.infer<typeof tileSchema>;
export const tileDraftSchema = runnerSchema.extend({ content: z.base64() });

export const tileNumbersSchema = z.strictObject({
  /** Numbers of tiles, with commas between them. */
  numbers: z
    .string()
    .regex(/^\d{1,6}(,\d{1,6})*$/)
    .transform((text) => text.split(",").map(Number))
    .pipe(z.array(z.int()).max(mostTilesRead)),
});

const person = z.strictObject({ accountId: z.uuid(), name: z.string() });

/** What a list tells of an exploration. */
export const explorationSummarySchema = z.strictObject({
  id: z.uuid(),
  scenarioId: z.uuid(),
  kind: z.enum(explorationKinds),
  title: z.string(),
  headline: z.string().nullable(),
  /** `running`: a page holds it; `stopped`: nobody does, and it is not done. */
  state: z.enum(["running", "stopped", "done"]),
  tilesSaved: z.int(),
  tiles: z.int(),
  scenarioVersion: z.int(),
  /** True where the scenario has other numbers by now. */
  isStale: z.boolean(),
  createdAt: z.iso.datetime(),
  createdBy: person,
});
export type ExplorationSummary = z.infer<typeof explorationSummarySchema>;

export const explorationSchema = explorationSummarySchema.extend({
  /** The scenario as it was asked of. */
  content: z.custom<Scenario>((value) => typeof value === "object" && value !== null),
  solverVersion: z.string(),
  plan: json,
  ...gridShape,
  answer: json.nullable(),
  /** Numbers of the tiles that are there. */
  saved: z.array(z.int()),
  /** Who computes it just now. */
  runner: person.nullable(),
});
export type StoredExploration = z.infer<typeof explorationSchema>;
