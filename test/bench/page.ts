import { readFileSync } from "node:fs";
import { gzipSync } from "node:zlib";

/** What a page loads before its first paint, from the built page: scripts that index.html names. Null where none is built. */
export function firstScripts(dist: string): { files: number; gzipKB: number } | null {
  const html = readIfThere(`${dist}/index.html`);
  if (html === null) return null;
  const names = [...html.matchAll(/(?:src|href)="\/([^"]+\.js)"/g)].map((match) => match[1]);
  const bytes = names.map((name) => gzipSync(readFileSync(`${dist}/${name}`), { level: 9 }).length);
  return { files: names.length, gzipKB: bytes.reduce((total, each) => total + each, 0) / 1000 };
}

function readIfThere(file: string): string | null {
  try {
    return readFileSync(file, "utf8");
  } catch {
    return null;
  }
}
