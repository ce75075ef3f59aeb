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

interface LimitsLineProps {
  limits: readonly LimitVerdict[];
  /** Values of the scenario are known as ranges, which a row does not go through. */
  isAsEntered?: boolean;
}

/** A scenario's limits in a few words, with a sign where there is a verdict. */
export function LimitsLine({ limits, isAsEntered }: LimitsLineProps) {
  const { colour, icon } = looks[standingOf(limits)];
  return (
    <span className={classNames("flex items-center gap-1.5", colour)}>
      {icon && <Icon name={icon} size={13} weight={2.4} />}
      {limitsWords(limits)}
      {isAsEntered && limits.length > 0 && ", as entered only"}
    </span>
  );
}
