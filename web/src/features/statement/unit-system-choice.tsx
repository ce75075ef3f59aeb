import { PlainSelect } from "../../components/select.tsx";
import { chooseUnitSystem, unitSystems, useUnitSystem } from "../../format/unit-system.ts";

const choices = unitSystems.map(({ key, label }) => ({ value: key, label }));

/** The units the person at this page thinks in; a unit chosen for one number stays with that number. */
export function UnitSystemChoice() {
  const system = useUnitSystem();
  const choose = (value: string): void => {
    const chosen = unitSystems.find(({ key }) => key === value);
    if (chosen) chooseUnitSystem(chosen.key);
  };
  return (
    <label className="mt-3 flex flex-wrap items-center gap-2 text-13 text-quiet">
      Units
      <PlainSelect choices={choices} value={system} onChange={(event) => choose(event.currentTarget.value)} />
      <span>for you, on every page; a unit chosen for one value stays with it</span>
    </label>
  );
}
