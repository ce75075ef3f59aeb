import { readFileSync, renameSync, writeFileSync } from "node:fs";

/** The end of a chain: how many rows it has, and the hash of the last, lower-case hex. */
export interface SeenEnd {
  readonly sequence: number;
  readonly hash: string;
}

/**
 * The ends of all chains as this server has last seen them, kept outside the database: what is signed by us and older, or
 * gone altogether, is told from what was there. By project; `nowhere` for the acts that concern none.
 */
export interface SeenEnds {
  readonly of: (projectId: string) => SeenEnd | undefined;
  readonly projects: () => string[];
  /** Notes an end that stands in the database for good. Only ever moves on. */
  readonly note: (projectId: string, end: SeenEnd) => void;
  /** Takes projects out that are removed by right. */
  readonly forget: (projectIds: readonly string[]) => void;
}

/** What is seen is in the file so much later, ms. */
const WRITTEN_AFTER = 300;

/**
 * @param file where they are kept, shared by the server processes of one folder; null: for as long as the process lasts
 * @throws Error where the file is there and is no list of ends
 */
export function openSeenEnds(file: string | null): SeenEnds {
  const ends = file === null ? new Map<string, SeenEnd>() : read(file);
  let timer: NodeJS.Timeout | undefined;
  const write = () => {
    timer = undefined;
    try {
      // Another process may have seen more.
      for (const [projectId, end] of read(file!)) moveOn(ends, projectId, end);
      replace(file!, ends);
    } catch {
      // No room on the disk, say: the server goes on, and what was seen is written with the next end that is.
    }
  };
  return {
    of: (projectId) => ends.get(projectId),
    projects: () => [...ends.keys()],
    note(projectId, end) {
      if (!moveOn(ends, projectId, end) || file === null) return;
      timer ??= setTimeout(write, WRITTEN_AFTER).unref();
    },
    forget(projectIds) {
      for (const projectId of projectIds) ends.delete(projectId);
      if (file !== null) replace(file, ends);
    },
  };
}

function moveOn(ends: Map<string, SeenEnd>, projectId: string, end: SeenEnd): boolean {
  if ((ends.get(projectId)?.sequence ?? 0) >= end.sequence) return false;
  ends.set(projectId, end);
  return true;
}

function read(file: string): Map<string, SeenEnd> {
  try {
    return new Map(Object.entries(JSON.parse(readFileSync(file, "utf8")) as Record<string, SeenEnd>));
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code === "ENOENT") return new Map();
    throw new Error(`The file ${file} cannot be read as the ends of trails that were seen.`, { cause: error });
  }
}

/** Whole or not at all, also where the process is killed meanwhile. */
function replace(file: string, ends: ReadonlyMap<string, SeenEnd>): void {
  const next = `${file}.${process.pid}`;
  writeFileSync(next, JSON.stringify(Object.fromEntries(ends)), { mode: 0o600 });
  renameSync(next, file);
}
