import type { Energy, Result } from "@restband/solver";
import { classNames } from "../../components/class-names.ts";
import { Icon } from "../../components/icon.tsx";
import { formatFixed, formatFully, formatNumber } from "../../format/format-number.ts";
import { fromSi, type Unit } from "../../format/unit.ts";
import { unitFor } from "../../format/units.ts";
import { balanceOf, allowedShare, largestEntry, ledgerRows, type LedgerRow } from "./ledger.ts";
import { PowerText } from "../../components/power-text.tsx";

/** Work, heat and what is left, each integrated on its own, and whether they close. */
export function EnergyLedger({ energy, method }: { energy: Energy; method: Result["method"] }) {
  const largest = largestEntry(energy);
  const unit = unitFor(largest, { dimension: "energy", motion: "linear" });
  const { residual, allowed, isBalanced } = balanceOf(energy, method);
  return (
    <div className="min-w-0 overflow-x-auto" tabIndex={0} role="region" aria-label="Energy over the run">
      <table className="w-full">
        <caption className="sr-only">Energy over the run</caption>
        <thead>
          <tr className="border-b border-edge text-13 text-quiet">
            <th scope="col" className="pb-2 text-left font-semibold">
              Over the run
            </th>
            <th scope="col" className="pb-2 text-right font-semibold">
              {unit.label}
            </th>
            <th scope="col" className="w-[30%] pb-2 pl-6 text-left font-semibold whitespace-nowrap">
              beside the largest
            </th>
          </tr>
        </thead>
        <tbody>
          {largest === 0 && (
            <tr>
              <td colSpan={3} className="py-1.5 text-quiet">
                Nothing moves, so no energy is exchanged.
              </td>
            </tr>
          )}
          {ledgerRows(energy).map((row) => (
            <Row key={row.name} row={row} unit={unit} largest={largest} />
          ))}
        </tbody>
        <tfoot>
          <tr className="border-t border-edge font-bold">
            <th scope="row" className="py-1.5 text-left">
              Unaccounted for
            </th>
            <td className="figures py-1.5 text-right whitespace-nowrap" title={`${formatFully(residual)} J`}>
              <PowerText text={formatNumber(fromSi(residual, unit), 2)} />
            </td>
            <td className={classNames("py-1.5 pl-6 whitespace-nowrap", isBalanced ? "text-kept" : "text-broken")}>
              <Icon name={isBalanced ? "check" : "cross"} size={14} weight={2.4} />{" "}
              {isBalanced ? "balances" : "does not balance"}
            </td>
          </tr>
        </tfoot>
      </table>
      <p className="mt-2 text-13 text-quiet">
        Allowed: <PowerText text={formatNumber(allowedShare(method), 1)} /> of the largest entry, here{" "}
        <PowerText text={`${formatNumber(fromSi(allowed, unit), 2)} ${unit.label}`} />.
      </p>
    </div>
  );
}

function Row({ row: { name, value }, unit, largest }: { row: LedgerRow; unit: Unit; largest: number }) {
  return (
    <tr className="border-b border-line">
      <th scope="row" className="py-1.5 text-left font-normal">
        {name}
      </th>
      <td className="figures py-1.5 text-right whitespace-nowrap" title={`${formatFully(value)} J`}>
        {formatFixed(fromSi(value, unit), decimalsFor(fromSi(largest, unit)))}
      </td>
      <td className="py-1.5 pl-6">
        <span
          aria-hidden="true"
          className={classNames("block h-2.5 min-w-px forced-color-adjust-none", value > 0 ? "bg-ink" : toneOf(name))}
          style={{ width: `${(100 * Math.abs(value)) / largest}%` }}
        />
      </td>
    </tr>
  );
}

/** Six digits of the largest entry; all others to the same decimal. */
const decimalsFor = (largest: number): number => Math.min(12, Math.max(0, 5 - Math.floor(Math.log10(largest))));

const toneOf = (name: string): string => (name.startsWith("Heat") ? "bg-stick" : "bg-slip");
