/**
 * The tables that are only ever added to. All rows of a project, in whichever of them, are links of one chain: each
 * carries its place and the hash of the row before it. The server's database account may read and add, nothing else.
 */
export const chainedTables = ["activity", "revisions", "replays", "review_requests", "decisions", "comments"] as const;
export type ChainedTable = (typeof chainedTables)[number];

/** All tables that are only ever added to: the links of chains, and the points of records that they name by digest. */
export const addedTables = [...chainedTables, "records"] as const;

/** Rows that carry a signature of their own, to be proved by themselves wherever they are taken. */
export const signedTables: ReadonlySet<ChainedTable> = new Set(["revisions", "decisions"]);

/** Stands for "no project" where a project's id is the key. */
export const nowhere = "00000000-0000-0000-0000-000000000000";
