import { lazy, type ComponentType, type LazyExoticComponent } from "react";

/** ms to the second attempt, doubled with each that follows, up to the longest. */
const FIRST_WAIT = 1000;
const LONGEST_WAIT = 60_000;

/**
 * A part of a page in a chunk of its own. Where the chunk does not come it is asked for again and again: a server that is
 * gone for a while costs the part, never the page around it and what is typed there.
 */
export function lazyPart<Props extends object>(
  load: () => Promise<ComponentType<Props>>,
): LazyExoticComponent<ComponentType<Props>> {
  return lazy(async () => ({ default: await persistently(load) }));
}

async function persistently<Part>(load: () => Promise<Part>): Promise<Part> {
  for (let wait = FIRST_WAIT; ; wait = Math.min(2 * wait, LONGEST_WAIT)) {
    try {
      return await load();
    } catch {
      await new Promise((resolve) => setTimeout(resolve, wait));
    }
  }
}
