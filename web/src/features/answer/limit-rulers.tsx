import type { LimitVerdict, RangeReport, Scenario } from "@restband/solver";
import { classNames } from "../../components/class-names.ts";
import { Icon } from "../../components/icon.tsx";
import { MarginRuler } from "../../components/margin-ruler.tsx";
import { formatNumber } from "../../format/format-number.ts";
import { joined } from "../../format/format-quantity.ts";
import { fromSi } from "../../format/unit.ts";
import { hasRanges } from "./lead-line.ts";
import { readLimit, type LimitReading } from "./limit-words.ts";
import { rangeVerdictWords, type RangeVerdictWords, type SayValue } from "./range-words.ts";

interface LimitRulersProps {
  scenario: Scenario;
  limits: readonly LimitVerdict[];
  /** What became of the limits over the ranges; null where there are none or they have not been run. */
  report: RangeReport | null;
  say: SayValue;
}

/** Each limit as a ruler with its verdict in words, over the ranges once they are run. */
export function LimitRulers({ scenario, limits, report, say }: LimitRulersProps) {
  if (limits.length === 0) return null;
  const asEntered = hasRanges(scenario);
  const overRanges = (i: number): RangeVerdictWords | null => report && rangeVerdictWords(report.verdicts[i], say);
  return (
    <ul className="mt-3 border-t border-line" aria-label="Limits">
      {limits.map((limit, i) => (
        <LimitRuler
          key={`${limit.quantity}${i}`}
          reading={readLimit(limit, scenario.motion, asEntered)}
          limit={limit}
          overRange={overRanges(i)}
        />
      ))}
    </ul>
  );
}

const colours = { kept: "text-kept", broken: "text-broken", unknown: "text-quiet" };

interface LimitRulerProps {
  limit: LimitVerdict;
  reading: LimitReading;
  overRange: RangeVerdictWords | null;
}

function LimitRuler({ limit, reading, overRange }: LimitRulerProps) {
  const { name, demand, value, from, to, unit } = reading;
  const word = overRange?.word ?? reading.word;
  // Kept as entered, yet a point of the range has no verdict: neither kept nor broken.
  const isOpen = overRange?.remark !== undefined && reading.verdict === "kept";
  const verdict = isOpen ? "unknown" : reading.verdict;
  const remark = isOpen ? `${reading.remark} as entered. ${overRange.remark}` : reading.remark;
  const format = (at: number): string => joined({ text: formatNumber(fromSi(at, unit)), unit: unit.label });
  const words = [overRange?.breaks, value, remark].filter(Boolean);
  return (
    <li className="grid items-center gap-x-7 gap-y-1 border-b border-line py-2.5 desk:grid-cols-[minmax(140px,200px)_minmax(0,500px)_minmax(220px,1fr)]">
      <p className="leading-snug max-desk:flex max-desk:flex-wrap max-desk:items-baseline max-desk:gap-x-2">
        <span className="font-semibold">{name}</span>
        <span className="text-13 text-quiet desk:block">{demand}</span>
      </p>
      <MarginRuler
        min={limit.min}
        max={limit.max}
        value={limit.value}
        verdict={reading.verdict}
        from={from}
        to={to}
        format={format}
        label={`${name}, ${demand}: ${word}. ${words.join(", ")}`}
      />
      <p>
        <span className={classNames("font-bold whitespace-nowrap", colours[verdict])}>
          {verdict !== "unknown" && <Icon name={verdict === "kept" ? "check" : "cross"} size={14} weight={2.4} />}{" "}
          {word}
        </span>
        {overRange?.breaks && <span className="font-bold text-broken">, {overRange.breaks}</span>}
        {value && (
          <>
            {" · "}
            <span className="font-semibold">{value}</span>
          </>
        )}
        {remark && `${value ? ", " : " · "}${remark}`}
      </p>
    </li>
  );
}
