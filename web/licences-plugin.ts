import { existsSync, readdirSync, readFileSync } from "node:fs";
import { dirname, join } from "node:path";
import type { Plugin } from "vite";
import type { LicensedPackage } from "./src/licences.ts";

interface Manifest {
  name: string;
  version: string;
  license?: string;
  dependencies?: Record<string, string>;
}

/** Fills `src/licences.ts`: every package the workspaces are made of, with its licence in its own words. */
export function licences(workspaces: readonly string[]): Plugin {
  return {
    name: "licences",
    load: (id) =>
      id.endsWith("/web/src/licences.ts") ? `export const packages = ${JSON.stringify(gather(workspaces))};` : null,
  };
}

function gather(workspaces: readonly string[]): LicensedPackage[] {
  const found = new Map<string, LicensedPackage>();
  const visit = (folder: string) => {
    for (const name of Object.keys(manifestOf(folder).dependencies ?? {})) {
      const place = locate(name, folder);
      if (!place) continue;
      const { version, license = "not stated" } = manifestOf(place);
      if (name.startsWith("@restband/") || found.has(`${name}@${version}`)) continue;
      found.set(`${name}@${version}`, { name, version, licence: license, text: licenceText(place) });
      visit(place);
    }
  };
  workspaces.forEach(visit);
  return [...found.values()].sort((a, b) => (a.name < b.name ? -1 : 1));
}

const manifestOf = (folder: string): Manifest =>
  JSON.parse(readFileSync(join(folder, "package.json"), "utf8")) as Manifest;

/** Where node would find a package asked for from a folder; null for one that is left out on this system. */
function locate(name: string, from: string): string | null {
  for (let folder = from; ; folder = dirname(folder)) {
    const place = join(folder, "node_modules", name);
    if (existsSync(join(place, "package.json"))) return place;
    if (dirname(folder) === folder) return null;
  }
}

function licenceText(folder: string): string {
  const file = readdirSync(folder).find((name) => /^(licen[cs]e|copying)/iu.test(name));
  return file ? readFileSync(join(folder, file), "utf8").trim() : "";
}
