import { lazy, type ComponentType, type LazyExoticComponent } from "react";
import { persistently } from "../later-part.ts";

/**
 * A part of a page in a chunk of its own. Where the chunk does not come it is asked for again and again: a server that is
 * gone for a while costs the part, never the page around it and what is typed there.
 */
export function lazyPart<Props extends object>(
  load: () => Promise<ComponentType<Props>>,
): LazyExoticComponent<ComponentType<Props>> {
  return lazy(async () => ({ default: await persistently(load) }));
}
