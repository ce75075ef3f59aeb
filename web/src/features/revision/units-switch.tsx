import { ownUnitSystem, unitSystems, type UnitSystem } from "../../format/unit-system.ts";

interface UnitsSwitchProps {
  /** Those the revision was frozen in. */
  units: UnitSystem;
  isOwn: boolean;
  onChange: (isOwn: boolean) => void;
}

const labelOf = (units: UnitSystem): string => unitSystems.find(({ key }) => key === units)?.label ?? units;

/** Shows a revision in one's own units instead of those it was frozen in. What was entered in a unit stays in it. */
export function UnitsSwitch({ units, isOwn, onChange }: UnitsSwitchProps) {
  const shown = labelOf(isOwn ? ownUnitSystem() : units);
  return (
    <p className="mt-3 flex flex-wrap items-center gap-x-3 text-13 text-quiet">
      Shown in {shown}
      {isOwn ? ", your own units." : ", the units it was frozen in."}
      <button type="button" className="link hit" onClick={() => onChange(!isOwn)}>
        {isOwn ? `Show it in ${labelOf(units)}, as it was frozen` : `Show it in ${labelOf(ownUnitSystem())}, your own`}
      </button>
    </p>
  );
}
