import type { LimitVerdict, Scenario } from "@restband/solver";
import { classNames } from "../../components/class-names.ts";
import { Icon } from "../../components/icon.tsx";
import { MarginRuler } from "../../components/margin-ruler.tsx";
import { formatNumber } from "../../format/format-number.ts";
import { joined } from "../../format/format-quantity.ts";
import { fromSi } from "../../format/unit.ts";
import { hasRanges } from "./lead-line.ts";
import { readLimit } from "./limit-words.ts";

/** Each limit as a ruler with its verdict in words. */
export function LimitRulers({ scenario, limits }: { scenario: Scenario; limits: readonly LimitVerdict[] }) {
  if (limits.length === 0) return null;
  const asEntered = hasRanges(scenario);
  return (
    <ul className="mt-3 border-t border-line" aria-label="Limits">
      {limits.map((limit, i) => (
        <LimitRuler key={`${limit.quantity}${i}`} limit={limit} scenario={scenario} asEntered={asEntered} />
      ))}
    </ul>
  );
}

const colours = { kept: "text-kept", broken: "text-broken", unknown: "text-quiet" };

function LimitRuler({ limit, scenario, asEntered }: { limit: LimitVerdict; scenario: Scenario; asEntered: boolean }) {
  const reading = readLimit(limit, scenario.motion, asEntered);
  const { name, demand, verdict, word, value, remark, from, to, unit } = reading;
  const format = (at: number): string => joined({ text: formatNumber(fromSi(at, unit)), unit: unit.label });
  const words = [value, remark].filter(Boolean);
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
        verdict={verdict}
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
