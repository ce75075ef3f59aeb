/** A path as messages and origins write it: `force[0].times[2]`. */
export function pathText(steps: readonly PropertyKey[]): string {
  return steps.reduce<string>((path, step) => {
    if (typeof step === "number") return `${path}[${step}]`;
    return path === "" ? String(step) : `${path}.${String(step)}`;
  }, "");
}
