import { spawn } from "node:child_process";
import { readFileSync } from "node:fs";
import { setTimeout as sleep } from "node:timers/promises";
import { root, Trouble } from "./project.mjs";

const running = new Set();

/**
 * Runs a program to its end. Its output is shown as it comes, or with `quiet` kept back and shown only if it fails.
 * @returns what it wrote to standard output (empty unless quiet)
 * @throws Trouble naming the program, where it does not end with 0
 */
export async function run(program, args, { quiet = false, env = {}, cwd = root } = {}) {
  const stdio = quiet ? ["ignore", "pipe", "pipe"] : ["ignore", "inherit", "inherit"];
  const child = spawn(program, args, { cwd, stdio, env: { ...process.env, ...env } });
  running.add(child);
  const written = { stdout: "", stderr: "" };
  for (const name of ["stdout", "stderr"])
    child[name]?.setEncoding("utf8").on("data", (text) => (written[name] += text));
  const code = await ended(child);
  running.delete(child);
  if (code !== 0)
    throw new Trouble(`${written.stdout}${written.stderr}${[program, ...args].join(" ")} failed (${code}).`);
  return written.stdout;
}

/** Ends what `run` has not finished. */
export function endRunning() {
  for (const child of running) child.kill("SIGTERM");
}

/** Resolves with the exit code of a child, the signal that ended it, or why it could not start. */
export function ended(child) {
  return new Promise((resolve) => {
    child.once("error", (error) => resolve(error.code ?? error.message));
    child.once("exit", (code, signal) => resolve(code ?? signal));
  });
}

/**
 * Starts a program that goes on until it is stopped, in a process group of its own: Ctrl-C in the terminal reaches only
 * the command that started it, which then stops everything in the right order.
 */
export function startService(program, args, { env = {}, cwd = root, stdio }) {
  const child = spawn(program, args, { cwd, stdio, detached: true, env: { ...process.env, ...env } });
  child.ended = ended(child);
  return child;
}

/** Asks a service to stop and waits; after the time given it is killed. */
export async function stopService(child, milliseconds = 15_000) {
  if (child.exitCode !== null || child.signalCode !== null) return;
  child.kill("SIGTERM");
  if ((await Promise.race([child.ended, sleep(milliseconds, "late", { ref: false })])) === "late")
    child.kill("SIGKILL");
  await child.ended;
}

/** True where the process lives and its command line holds the text; where command lines cannot be read, where it lives. */
export function isProcess(pid, text) {
  if (!Number.isInteger(pid) || pid < 2) return false;
  try {
    process.kill(pid, 0);
  } catch {
    return false;
  }
  try {
    return readFileSync(`/proc/${pid}/cmdline`, "utf8").replaceAll("\0", " ").includes(text);
  } catch {
    return process.platform !== "linux";
  }
}

/** Stops a process that is no child of ours and waits until it is gone. */
export async function stopProcess(pid, text, milliseconds = 15_000) {
  const until = Date.now() + milliseconds;
  for (let signal = "SIGTERM"; isProcess(pid, text); await sleep(50)) {
    if (Date.now() > until) signal = "SIGKILL";
    process.kill(pid, signal);
  }
}
