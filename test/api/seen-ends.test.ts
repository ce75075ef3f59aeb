import { mkdtempSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterAll, expect, it, vi } from "vitest";
import { openSeenEnds } from "../../api/src/chain/seen-ends.ts";

const folder = mkdtempSync(join(tmpdir(), "restband-"));
afterAll(() => rmSync(folder, { recursive: true }));

const end = (sequence: number) => ({ sequence, hash: String(sequence).padStart(64, "0") });

it("only moves on, and forgets what is removed by right", () => {
  const ends = openSeenEnds(null);
  for (const sequence of [1, 3, 2]) ends.note("a", end(sequence));
  expect([ends.of("a"), ends.of("b"), ends.projects()]).toEqual([end(3), undefined, ["a"]]);
  ends.forget(["a"]);
  expect(ends.projects()).toEqual([]);
});

it("keeps what two processes have seen in one file", async () => {
  const file = join(folder, "two.json");
  const [one, other] = [openSeenEnds(file), openSeenEnds(file)];
  one.note("a", end(5));
  other.note("a", end(4));
  other.note("b", end(1));
  await vi.waitFor(() => {
    const kept = openSeenEnds(file);
    expect([kept.of("a"), kept.of("b")]).toEqual([end(5), end(1)]);
  });
});

it("does not begin anew where the file is garbage", () => {
  const file = join(folder, "garbage.json");
  writeFileSync(file, "{");
  expect(() => openSeenEnds(file)).toThrow(/garbage\.json cannot be read as the ends of trails/);
  expect(readFileSync(file, "utf8")).toBe("{");
});
