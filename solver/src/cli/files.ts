import { readFile } from "node:fs/promises";
import { UsageError } from "./arguments.ts";

/** The text of a file. Throws UsageError where it cannot be read. */
export async function readText(file: string): Promise<string> {
  try {
    return await readFile(file, "utf8");
  } catch (error) {
    throw new UsageError(`The file cannot be read: ${(error as Error).message}.`);
  }
}

/** A fault as a line of standard error. */
export const told = (path: string, message: string): string => (path === "" ? message : `${path}: ${message}`);
