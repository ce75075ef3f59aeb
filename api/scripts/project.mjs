import { chmodSync, existsSync, mkdirSync, readFileSync, writeFileSync } from "node:fs";
import { dirname, join, resolve } from "node:path";
import { fileURLToPath } from "node:url";

/** Where the project lies. */
export const root = dirname(dirname(dirname(fileURLToPath(import.meta.url))));

/** What a machine keeps to itself: database, passwords, logs. Ignored by git; `RESTBAND_LOCAL` puts it elsewhere. */
export const local = resolve(process.env.RESTBAND_LOCAL ?? join(root, ".local"));

/** Something that only the person at the terminal can put right: shown as its sentence, without a stack. */
export class Trouble extends Error {}

export function say(text) {
  console.log(text);
}

/** Runs a command's main function; ends the process with 1 and the sentence where that fails. */
export async function main(work) {
  try {
    process.exitCode = (await work()) ?? 0;
  } catch (error) {
    console.error(error instanceof Trouble ? error.message : error);
    process.exitCode = 1;
  }
}

/** Makes a folder that only its owner may look into. */
export function makePrivateFolder(folder) {
  try {
    mkdirSync(folder, { recursive: true, mode: 0o700 });
    writeFileSync(join(folder, ".writable"), "");
  } catch (error) {
    if (error.code !== "EACCES" && error.code !== "EPERM" && error.code !== "EROFS") throw error;
    throw new Trouble(`${folder} cannot be written by this user. Run as the user it belongs to, or remove it.`);
  }
}

/** Writes a file that only its owner may read, even where it was there before. */
export function writePrivate(file, text) {
  writeFileSync(file, text, { mode: 0o600 });
  chmodSync(file, 0o600);
}

/** The text of a file that is made once, by the first who asks, and kept. */
export function keep(file, make) {
  if (!existsSync(file)) writePrivate(file, make());
  return readFileSync(file, "utf8");
}

/** The text of a file, or null where there is none. */
export function readIfThere(file) {
  return existsSync(file) ? readFileSync(file, "utf8") : null;
}
