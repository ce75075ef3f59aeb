import { classNames } from "./class-names.ts";
import { Icon } from "./icon.tsx";

interface StateMarkProps {
  word: string;
  /** `kept` and `broken` have a sign and a colour besides the word. */
  tone: "kept" | "broken" | "quiet";
  /** What it means, for those who point at it. */
  says?: string;
  className?: string;
}

const looks = { kept: "text-kept", broken: "text-broken", quiet: "" };

/** How something stands, in a word; told apart by sign and word, colour last. */
export function StateMark({ word, tone, says, className }: StateMarkProps) {
  return (
    <span className={classNames("font-semibold whitespace-nowrap", looks[tone], className)} title={says}>
      {tone !== "quiet" && <Icon name={tone === "kept" ? "check" : "cross"} size={13} weight={2.4} />}
      {tone !== "quiet" && " "}
      {word}
    </span>
  );
}
