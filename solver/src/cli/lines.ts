import { once } from "node:events";
import type { Readable, Writable } from "node:stream";

/**
 * The lines of a stream, without their ends. Only "\n" and "\r\n" end a line: a JSON text may hold other separators. A last
 * line without an end counts, an empty rest after the last end does not.
 */
export async function* linesOf(stream: Readable): AsyncGenerator<string> {
  stream.setEncoding("utf8");
  let pending: string[] = [];
  for await (const chunk of stream as AsyncIterable<string>) {
    const parts = chunk.split("\n");
    for (const part of parts.slice(0, -1)) {
      pending.push(part);
      yield withoutReturn(pending.join(""));
      pending = [];
    }
    pending.push(parts[parts.length - 1]);
  }
  const rest = pending.join("");
  if (rest !== "") yield withoutReturn(rest);
}

const withoutReturn = (line: string) => (line.endsWith("\r") ? line.slice(0, -1) : line);

/** Writes a line and waits while the reader is behind, so that a slow reader costs no memory. */
export async function writeLine(stream: Writable, line: string): Promise<void> {
  if (!stream.write(`${line}\n`)) await once(stream, "drain");
}
