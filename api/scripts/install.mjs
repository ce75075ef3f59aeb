import { createHash } from "node:crypto";
import { accessSync, constants, writeFileSync } from "node:fs";
import { join } from "node:path";
import { readIfThere, root, say, Trouble } from "./project.mjs";
import { run } from "./processes.mjs";

const stampFile = join(root, "node_modules", ".restband-lockfile");

/** Installs the packages of the lockfile where they are missing or it has changed since. */
export async function installPackages() {
  const lockfile = readIfThere(join(root, "package-lock.json"));
  const stamp = createHash("sha256").update(lockfile).digest("hex");
  if (readIfThere(stampFile) === stamp) return;
  if (!isInstalled(JSON.parse(lockfile))) {
    say("Installing packages (npm ci); the first time takes a minute or two.");
    await run("npm", ["ci", "--no-audit", "--no-fund"], { quiet: true });
  }
  writeFileSync(stampFile, stamp);
}

/** True where npm's own record says that everything of the lockfile is there already: after `npm install`, say. */
function isInstalled({ packages: wanted }) {
  const record = readIfThere(join(root, "node_modules", ".package-lock.json"));
  if (!record) return false;
  const there = JSON.parse(record).packages;
  return Object.entries(wanted).every(
    ([path, { version, link, optional }]) =>
      !path.includes("node_modules/") || link || optional || there[path]?.version === version,
  );
}

/** Says what is wrong with this version of Node, if anything, before anything else can fail for it. */
export function demandNode() {
  const [major, minor] = process.versions.node.split(".").map(Number);
  const fits = (major === 20 && minor >= 19) || (major === 22 && minor >= 12) || major > 22;
  if (!fits) throw new Trouble(`Restband runs on Node 20.19 or later, or 22.12 or later; this is ${process.version}.`);
}

/** The full path of a program in the usual folders (system ones too, which ordinary users have not in their PATH), or null. */
export function findProgram(name) {
  const folders = [
    ...(process.env.PATH ?? "").split(":"),
    "/usr/local/sbin",
    "/usr/sbin",
    "/usr/local/bin",
    "/usr/bin",
  ];
  return folders.map((folder) => join(folder, name)).find(isExecutable) ?? null;
}

function isExecutable(file) {
  try {
    accessSync(file, constants.X_OK);
    return true;
  } catch {
    return false;
  }
}

/** Makes sure that the programs are there: installs Debian's packages as root, else names the command that would. */
export function installPrograms(programs, packages) {
  return installWhile(() => Promise.resolve(programs.some((name) => !findProgram(name))), programs, packages);
}

/** Makes sure that Debian's Python has scipy: the files that recheck a run are tried with it. */
export function installScipy() {
  const isMissing = () =>
    run("/usr/bin/python3", ["-c", "import scipy.integrate"], { quiet: true }).then(
      () => false,
      () => true,
    );
  return installWhile(isMissing, ["scipy"], ["python3-scipy"]);
}

async function installWhile(isMissing, wanted, packages) {
  if (!(await isMissing())) return;
  const install = ["install", "-y", "--no-install-recommends", ...packages];
  const byHand = `sudo apt-get update && sudo apt-get ${install.filter((word) => word !== "-y").join(" ")}`;
  if (process.getuid?.() !== 0 || !findProgram("apt-get")) {
    throw new Trouble(`${wanted.join(" and ")} are needed. Install them with: ${byHand}`);
  }
  say(`Installing ${packages.join(" and ")}.`);
  const env = { DEBIAN_FRONTEND: "noninteractive" };
  await run("apt-get", ["update"], { quiet: true, env });
  await run("apt-get", install, { quiet: true, env });
  if (await isMissing()) throw new Trouble(`${packages.join(" and ")} did not bring ${wanted.join(" and ")}.`);
}
