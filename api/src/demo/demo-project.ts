import type { Role } from "../members/members-schema.ts";
import type { DemoPerson } from "./demo-people.ts";

/** A project of the demo; who owns it makes it and everything in it that names no other author. */
export interface DemoProject {
  readonly name: string;
  readonly description: string;
  readonly owner: DemoPerson;
  readonly members: Partial<Record<DemoPerson, Role>>;
  readonly scenarios: readonly { readonly by: DemoPerson; readonly content: Readonly<Record<string, unknown>> }[];
}
