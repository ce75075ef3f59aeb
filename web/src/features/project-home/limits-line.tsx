import type { LimitVerdict } from "@restband/solver";
import { classNames } from "../../components/class-names.ts";
import { Icon, type IconName } from "../../components/icon.tsx";
import { limitsWords, standingOf, type Standing } from "./headline.ts";

const looks: Record<Standing, { colour: string; icon?: IconName }> = {
  broken: { colour: "text-broken", icon: "cross" },
  kept: { colour: "text-kept", icon: "check" },
  unjudged: { colour: "text-quiet" },
  "no-limits": { colour: "text-quiet" },
};

/** A scenario's limits in a few words, with a sign where there is a verdict. */
export function LimitsLine({ limits }: { limits: readonly LimitVerdict[] }) {
  const { colour, icon } = looks[standingOf(limits)];
  return (
    <span className={classNames("flex items-center gap-1.5", colour)}>
      {icon && <Icon name={icon} size={13} weight={2.4} />}
      {limitsWords(limits)}
    </span>
  );
}
