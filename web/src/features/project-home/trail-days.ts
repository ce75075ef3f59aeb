/** The instant at which a day begins in the reader's own zone; undefined for what is no day. */
export function fromDay(day: string): string | undefined {
  const [year, month, date] = day.split("-").map(Number);
  const instant = new Date(year, month - 1, date);
  return Number.isNaN(instant.getTime()) ? undefined : instant.toISOString();
}

/** The instant at which a day is over. */
export function toDay(day: string): string | undefined {
  const [year, month, date] = day.split("-").map(Number);
  const instant = new Date(year, month - 1, date + 1);
  return Number.isNaN(instant.getTime()) ? undefined : instant.toISOString();
}

/** The day of an instant as a field of dates has it, moved by so many days; empty for none. */
export function dayOf(instant: string | undefined, move = 0): string {
  if (instant === undefined) return "";
  const at = new Date(instant);
  const day = new Date(at.getFullYear(), at.getMonth(), at.getDate() + move);
  const two = (figure: number) => String(figure).padStart(2, "0");
  return `${day.getFullYear()}-${two(day.getMonth() + 1)}-${two(day.getDate())}`;
}
