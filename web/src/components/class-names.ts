/** Joins the class names that hold: `classNames("a", isB && "b")`. */
export function classNames(...names: (string | false | null | undefined)[]): string {
  return names.filter(Boolean).join(" ");
}
