import type { Anchor } from "../comments/comments-schema.ts";
import type { Role } from "../members/members-schema.ts";
import type { DemoPerson } from "./demo-people.ts";

interface DemoComment {
  readonly anchor: Anchor;
  readonly words: string;
  readonly answer?: string;
}

/** How a scenario became what it is: frozen as it was first and returned, changed, frozen again and accepted. */
export interface DemoReview {
  readonly reviewer: DemoPerson;
  readonly first: Readonly<Record<string, unknown>>;
  readonly returned: { readonly request: string; readonly reasons: string; readonly comments: readonly DemoComment[] };
  readonly accepted: { readonly request: string; readonly reasons: string; readonly comments: readonly DemoComment[] };
  /** The project's. */
  readonly checklist: readonly string[];
}

/** A project of the demo; who owns it makes it and everything in it that names no other author. */
export interface DemoProject {
  readonly name: string;
  readonly description: string;
  readonly owner: DemoPerson;
  readonly members: Partial<Record<DemoPerson, Role>>;
  readonly scenarios: readonly {
    readonly by: DemoPerson;
    readonly content: Readonly<Record<string, unknown>>;
    readonly review?: DemoReview;
  }[];
}
