import type { Result, Scenario } from "@restband/solver";
import { EnergyLedger } from "./energy-ledger.tsx";
import { methodWords, noteWords } from "./method-words.ts";
import { Textbook } from "./textbook.tsx";

/** What the run says of itself: its energy, the textbook beside it, its method, its notes. */
export function Checks({ scenario, result }: { scenario: Scenario; result: Result }) {
  return (
    <div className="grid items-start gap-x-10 gap-y-8 wide:grid-cols-2">
      <div className="grid min-w-0 gap-y-8">
        {result.energy && <EnergyLedger energy={result.energy} method={result.method} />}
        <Computation scenario={scenario} result={result} />
      </div>
      <Textbook scenario={scenario} result={result} />
    </div>
  );
}

/** Method, tolerance and end of the run, and its notes. */
function Computation({ scenario, result }: { scenario: Scenario; result: Result }) {
  return (
    <div>
      <h3 className="border-b border-edge pb-2 text-13 font-semibold text-quiet">How it was computed</h3>
      {methodWords(scenario, result).map((sentence) => (
        <p key={sentence} className="mt-2.5 max-w-(--measure)">
          {sentence}
        </p>
      ))}
      {result.notes.length > 0 && (
        <ul className="mt-4 border-t border-line" aria-label="Notes">
          {result.notes.map((note) => (
            <li key={note.code + note.message} className="max-w-(--measure) border-b border-line py-2">
              {noteWords(note)}
            </li>
          ))}
        </ul>
      )}
    </div>
  );
}
