import { classNames } from "./class-names.ts";
import { PowerText } from "./power-text.tsx";

interface FigureProps {
  text: string;
  unit: string;
  /** All digits, for those who point at it. */
  full?: string;
  className?: string;
}

/** A number that can change and its unit: figures of one width, the unit as quiet text. A degree sign stands close. */
export function Figure({ text, unit, full, className }: FigureProps) {
  return (
    <span className={classNames("whitespace-nowrap", className)} title={full}>
      <span className="figures">
        <PowerText text={text} />
      </span>
      {unit && (
        <span className={classNames("text-[0.8em] font-normal text-quiet", !unit.startsWith("°") && "ml-[0.25em]")}>
          {unit}
        </span>
      )}
    </span>
  );
}
