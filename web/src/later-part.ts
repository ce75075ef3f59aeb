/** ms to the second attempt, doubled with each that follows, up to the longest. */
const FIRST_WAIT = 1000;
const LONGEST_WAIT = 60_000;

/** Loads something again and again until it comes. */
export async function persistently<Part>(load: () => Promise<Part>): Promise<Part> {
  for (let wait = FIRST_WAIT; ; wait = Math.min(2 * wait, LONGEST_WAIT)) {
    try {
      return await load();
    } catch {
      await new Promise((resolve) => setTimeout(resolve, wait));
    }
  }
}

/** A part of a page that is no component, in a chunk of its own, asked for until it comes. */
export interface LaterPart<Part> {
  /** Null until it is there. */
  readonly now: () => Part | null;
  /** Always the same promise. */
  readonly ask: () => Promise<Part>;
}

export function laterPart<Part>(load: () => Promise<Part>): LaterPart<Part> {
  let there: Part | null = null;
  let coming: Promise<Part> | null = null;
  const come = (part: Part): Part => (there = part);
  return { now: () => there, ask: () => (coming ??= persistently(load).then(come)) };
}
