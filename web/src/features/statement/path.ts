/** Steps of a path as the format writes them: "force[0].times[2]" → ["force", 0, "times", 2]. */
export function stepsOf(path: string): (string | number)[] {
  return [...path.matchAll(/([^.[\]]+)|\[(\d+)\]/g)].map(([, name, index]) => name ?? Number(index));
}

/** The value at a path, or undefined where there is none. */
export function readPath(root: unknown, path: string): unknown {
  return stepsOf(path).reduce<unknown>((value, step) => (isBranch(value) ? value[step] : undefined), root);
}

/** A copy with one value replaced; whatever is not on the way is shared. A path that leads nowhere changes nothing. */
export function writePath<T>(root: T, path: string, value: unknown): T {
  return writeSteps(root, stepsOf(path), value) as T;
}

function writeSteps(node: unknown, [step, ...others]: (string | number)[], value: unknown): unknown {
  if (step === undefined) return value;
  if (!isBranch(node)) return node;
  const changed = writeSteps(node[step], others, value);
  if (Array.isArray(node)) return node.map((item: unknown, i) => (i === step ? changed : item));
  return changed === undefined ? without(node, String(step)) : { ...node, [step]: changed };
}

/** A copy of a record without one of its members. */
export function without<T extends object>(record: T, key: string): T {
  return Object.fromEntries(Object.entries(record).filter(([name]) => name !== key)) as T;
}

type Branch = Record<string | number, unknown>;
const isBranch = (value: unknown): value is Branch => typeof value === "object" && value !== null;

/** True for the path itself and everything below it. */
export function isUnder(path: string, root: string): boolean {
  return path === root || (path.startsWith(root) && (path[root.length] === "." || path[root.length] === "["));
}

/** Renames a list's item in a path: "force[2].hz" → "force[1].hz" where `move` says so; null where the item is gone. */
export function movePath(path: string, list: string, move: (index: number) => number | null): string | null {
  const steps = stepsOf(path);
  if (steps[0] !== list || typeof steps[1] !== "number") return path;
  const index = move(steps[1]);
  return index === null ? null : path.replace(`${list}[${steps[1]}]`, `${list}[${index}]`);
}
