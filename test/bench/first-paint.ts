/**
 * How much JavaScript, gzipped, stands between an address and the first paint of each page: what `index.html` asks for and
 * what the page's own chunk imports. Parts a page loads later (plots, forms, dialogs) and the solver's worker, which runs
 * beside it, are not in it. Reads a finished build in `web/dist`.
 */
import { readdirSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { gzipSync } from "node:zlib";

const dist = new URL("../../web/dist/", import.meta.url).pathname;
const assets = readdirSync(join(dist, "assets"));

/** The budget for the page people live in, kB. */
const ALLOWED = 180;

const size = (file: string): number => gzipSync(readFileSync(join(dist, file))).length / 1000;

/** A chunk and all it imports before it runs; dynamic imports are left out. */
function withImports(file: string, seen = new Set<string>()): Set<string> {
  if (seen.has(file)) return seen;
  seen.add(file);
  const text = readFileSync(join(dist, file), "utf8");
  for (const [, name] of text.matchAll(/(?:from|import)\s*["']\.\/([^"']+\.js)["']/gu))
    withImports(`assets/${name}`, seen);
  return seen;
}

function firstPaint(page: string): { total: number; chunks: [string, number][] } {
  const html = readFileSync(join(dist, "index.html"), "utf8");
  const asked = [...html.matchAll(/(?:src|href)="\/([^"]+\.js)"/gu)].map(([, file]) => file);
  const own = assets
    .filter((file) => file.startsWith(`${page}-`) && file.endsWith(".js"))
    .map((file) => `assets/${file}`);
  if (own.length !== 1) throw new Error(`web/dist has ${own.length} chunks of the page ${page}; build it first.`);
  const seen = new Set<string>();
  for (const file of [...asked, ...own]) withImports(file, seen);
  const chunks = [...seen].map((file): [string, number] => [file, size(file)]).sort(([, a], [, b]) => b - a);
  return { total: chunks.reduce((sum, [, each]) => sum + each, 0), chunks };
}

const pages = ["scenario-page", "project-page", "projects-page", "sign-in-page"];
for (const page of pages) console.log(`${page.padEnd(16)} ${firstPaint(page).total.toFixed(1).padStart(6)} kB`);
console.log(`\nscenario-page, ${ALLOWED} kB allowed:`);
for (const [file, kB] of firstPaint(pages[0]).chunks) console.log(`${kB.toFixed(1).padStart(6)}  ${file}`);
