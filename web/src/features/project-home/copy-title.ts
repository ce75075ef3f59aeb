/** The next free title for a copy: "Slide, copy", "Slide, copy 2". */
export function copyTitle(title: string, taken: readonly string[]): string {
  const names = new Set(taken);
  const stem = `${(title || "Untitled").replace(/, copy(?: \d+)?$/u, "").slice(0, 180)}, copy`;
  for (let n = 1; ; n++) {
    const next = n === 1 ? stem : `${stem} ${n}`;
    if (!names.has(next)) return next;
  }
}
