import { classNames } from "./class-names.ts";

/** First letters of the first and the last word: "Ines Duarte" gives "ID". */
export function initialsOf(name: string): string {
  const words = name.trim().split(/\s+/u).filter(Boolean);
  const chosen = words.length > 1 ? [words[0], words[words.length - 1]] : words;
  return chosen.map((word) => [...word][0].toUpperCase()).join("");
}

/** A person's initials in a ring; the name stands beside it, so it is silent. An empty ring for nobody yet. */
export function Avatar({ name, className }: { name: string | null; className?: string }) {
  return (
    <span
      aria-hidden="true"
      className={classNames(
        "inline-flex size-[30px] shrink-0 items-center justify-center rounded-full border border-edge text-13 font-bold",
        name === null && "border-dashed",
        className,
      )}
    >
      {name !== null && initialsOf(name)}
    </span>
  );
}
