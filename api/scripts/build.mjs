import { createHash } from "node:crypto";
import { existsSync, readdirSync, readFileSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { run } from "./processes.mjs";
import { readIfThere, root, say } from "./project.mjs";

const shared = ["package-lock.json", "tsconfig.base.json", "solver"];

const parts = [
  { workspace: "api", inputs: [...shared, "api", "migrations"], output: "api/dist/server.js" },
  { workspace: "web", inputs: [...shared, "web", "fonts", "api/src"], output: "web/dist/index.html" },
];

/** What lies among the sources and is no source. */
const products = new Set(["dist", "node_modules"]);

/** Builds the server and the pages where they are missing or a source has changed since. */
export async function build(workspaces = ["api", "web"]) {
  const stale = parts.filter(({ workspace }) => workspaces.includes(workspace)).filter(isStale);
  if (stale.length === 0) return;
  say(`Building ${stale.map(({ workspace }) => workspace).join(" and ")}.`);
  await Promise.all(stale.map(buildPart));
}

function isStale(part) {
  return !existsSync(join(root, part.output)) || readIfThere(stampOf(part)) !== hashOf(part.inputs);
}

async function buildPart(part) {
  const hash = hashOf(part.inputs);
  await run("npm", ["run", "--silent", "build", "--workspace", part.workspace], {
    quiet: true,
    env: { NODE_ENV: "production", NO_COLOR: "1" },
  });
  writeFileSync(stampOf(part), hash);
}

/** Beside the build, so that it goes when that goes; a name with a dot is never served. */
function stampOf({ workspace }) {
  return join(root, workspace, "dist", ".inputs");
}

function hashOf(inputs) {
  const hash = createHash("sha256");
  for (const input of inputs)
    for (const file of filesOf(input)) hash.update(file).update(readFileSync(join(root, file)));
  return hash.digest("hex");
}

function filesOf(path) {
  if (!existsSync(join(root, path))) return [];
  const entries = namesIn(path);
  return entries ? entries.flatMap((name) => filesOf(join(path, name))) : [path];
}

/** The names in a folder, sorted, so that the hash is the same everywhere; null for a file. */
function namesIn(path) {
  try {
    return readdirSync(join(root, path))
      .filter((name) => !products.has(name))
      .sort();
  } catch (error) {
    if (error.code === "ENOTDIR") return null;
    throw error;
  }
}
