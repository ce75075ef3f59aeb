import { spawnSync } from "node:child_process";
import { mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";

/** Runs a Python file with Debian's own interpreter, which `npm test` has given scipy. */
export function runPython(text: string): { status: number | null; output: string } {
  const folder = mkdtempSync(join(tmpdir(), "restband-"));
  try {
    const file = join(folder, "recheck.py");
    writeFileSync(file, text);
    const { status, stdout, stderr } = spawnSync("/usr/bin/python3", [file], { encoding: "utf8" });
    return { status, output: stdout + stderr };
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}
