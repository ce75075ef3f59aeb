import { rmSync } from "node:fs";
import { join } from "node:path";
import { isProcess } from "./processes.mjs";
import { local, makePrivateFolder, readIfThere, Trouble, writePrivate } from "./project.mjs";

const file = join(local, "running.json");

/** What `npm start` or `npm run dev` has told about itself: `{pid, script, address}`, or null where none of them runs. */
export function findRunning() {
  const text = readIfThere(file);
  const told = text ? JSON.parse(text) : null;
  return told && isProcess(told.pid, told.script) ? told : null;
}

/** One server a folder: tells who is there first, else takes the place. */
export function takePlace(script) {
  makePrivateFolder(local);
  const other = findRunning();
  if (other) {
    const where = other.address ? ` at ${other.address}` : "";
    throw new Trouble(`Restband runs from this folder already${where} (process ${other.pid}). Stop it there first.`);
  }
  tellRunning({ script });
}

export function tellRunning({ script, address }) {
  writePrivate(file, JSON.stringify({ pid: process.pid, script, address }));
}

export function leavePlace() {
  rmSync(file, { force: true });
}
