import type { ReactNode } from "react";
import { useChangeUnits } from "../../api/session.ts";
import { PlainSelect } from "../../components/select.tsx";
import { announce } from "../../components/status.tsx";
import { showUnitSystem, unitSystems, useUnitSystem } from "../../format/unit-system.ts";

const choices = unitSystems.map(({ key, label }) => ({ value: key, label }));

/** The units the person signed in thinks in, on every page and wherever they sign in; a hint may follow. */
export function UnitsChoice({ children }: { children?: ReactNode }) {
  const system = useUnitSystem();
  const change = useChangeUnits();
  const choose = (value: string): void => {
    const chosen = unitSystems.find(({ key }) => key === value);
    if (!chosen) return;
    showUnitSystem(chosen.key);
    change.mutate(chosen.key, {
      onError: () => announce("These units last as long as this page: the server did not take the choice."),
    });
  };
  return (
    <label className="flex flex-wrap items-center gap-2 text-13 text-quiet">
      Units
      <PlainSelect choices={choices} value={system} onChange={(event) => choose(event.currentTarget.value)} />
      {children}
    </label>
  );
}
