import { build } from "../../api/scripts/build.mjs";

/** The pages as they are served: built where a source has changed since the last build. */
export async function setup(): Promise<void> {
  await build(["web"]);
}
