import { spawn } from "node:child_process";
import { fileURLToPath } from "node:url";

const root = fileURLToPath(new URL("../../../", import.meta.url));

export interface Solved {
  status: number | null;
  out: string;
  err: string;
  /** Each line of standard output, read as JSON. */
  lines: unknown[];
}

/** Runs the command line as a person does, in a process of its own. */
export async function solve(args: readonly string[], input = ""): Promise<Solved> {
  const child = spawn(process.execPath, ["--import", "tsx", "solver/src/cli.ts", ...args], { cwd: root });
  let [out, err] = ["", ""];
  child.stdout.setEncoding("utf8").on("data", (text: string) => (out += text));
  child.stderr.setEncoding("utf8").on("data", (text: string) => (err += text));
  child.stdin.on("error", () => {});
  child.stdin.end(input);
  const status = await new Promise<number | null>((resolve) => child.on("close", resolve));
  const lines =
    out.startsWith("{") || out.startsWith("[")
      ? out
          .trimEnd()
          .split("\n")
          .map((line) => JSON.parse(line) as unknown)
      : [];
  return { status, out, err, lines };
}
