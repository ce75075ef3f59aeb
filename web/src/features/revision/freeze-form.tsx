import { keptResultOf, type Revision } from "@restband/api/contract";
import { traceOf, type Result, type Scenario } from "@restband/solver";
import { ApiFailure } from "../../api/api-failure.ts";
import { useFreeze } from "../../api/revisions.ts";
import { Button } from "../../components/button.tsx";
import { DialogActions } from "../../components/dialog.tsx";
import { ErrorNote } from "../../components/error-note.tsx";
import { outcomeWords } from "../../format/outcomes.ts";
import { unitSystem, unitSystems } from "../../format/unit-system.ts";
import { capitalised, sayMany } from "../../format/words.ts";

/** What is frozen: a stored version, and what came of it on this page. */
export interface Freezable {
  readonly projectId: string;
  readonly scenarioId: string;
  readonly version: number;
  readonly digest: string;
  readonly scenario: Scenario;
  readonly result: Result;
}

interface FreezeFormProps {
  subject: Freezable;
  /** Labels of the values nobody has said the origin of. */
  missing: readonly string[];
  onFrozen: (revision: Revision) => void;
  onClose: () => void;
}

/** Says what will be frozen and what is missing, has the server run it too, and shows its refusal where it comes to something else. */
export function FreezeForm({ subject, missing, onFrozen, onClose }: FreezeFormProps) {
  const freeze = useFreeze(subject.projectId, subject.scenarioId);
  const begin = (): void => {
    const { version, digest, result } = subject;
    const trace = traceOf(result.samples ?? noSamples);
    const body = { version, digest, units: unitSystem(), result: keptResultOf(result), trace };
    freeze.mutate(body, { onSuccess: onFrozen });
  };
  return (
    <>
      <p className="max-w-(--measure)">
        The scenario is kept as it stands now, with its answer, under a number of its own. Nobody can change it
        afterwards. You go on with the working copy.
      </p>
      <Contents subject={subject} />
      <Missing labels={missing} />
      {freeze.isPending && (
        <p role="status" className="mt-4 text-quiet">
          The server runs it too, for at most 20 seconds.
        </p>
      )}
      {freeze.error && <FreezeFailure error={freeze.error} />}
      <DialogActions>
        <Button kind="primary" data-first-focus isBusy={freeze.isPending} onClick={begin}>
          Freeze it
        </Button>
        <Button onClick={onClose}>Cancel</Button>
      </DialogActions>
    </>
  );
}

const noColumn = new Float64Array(0);
const noSamples = { t: noColumn, x: noColumn, v: noColumn, a: noColumn, f: noColumn, phase: noColumn };

function Contents({ subject: { scenario, result, digest } }: { subject: Freezable }) {
  const kept = result.limits.filter((limit) => limit.kept).length;
  const units = unitSystems.find(({ key }) => key === unitSystem())?.label ?? "";
  const rows: readonly (readonly [string, string])[] = [
    ["Title", scenario.title || "Untitled"],
    ["Answer", result.outcome ? outcomeWords[result.outcome] : "none: the run was cut off"],
    ["Limits", result.limits.length > 0 ? `${kept} of ${result.limits.length} kept` : "none set"],
    ["Read in", units],
    ["Computed by", `solver ${result.solverVersion}, ${result.method} method`],
    ["Digest", `${digest.slice(0, 16)}…`],
  ];
  return (
    <dl className="mt-4 grid grid-cols-[auto_minmax(0,1fr)] gap-x-5 border-t border-line">
      {rows.map(([name, value]) => (
        <div key={name} className="col-span-2 grid grid-cols-subgrid border-b border-line py-1.5">
          <dt className="text-13/[22px] text-quiet">{name}</dt>
          <dd className="wrap-anywhere">{value}</dd>
        </div>
      ))}
    </dl>
  );
}

function Missing({ labels }: { labels: readonly string[] }) {
  if (labels.length === 0) return <p className="mt-4">Every value says where it comes from.</p>;
  return (
    <div className="mt-4">
      <p>
        <strong>{capitalised(sayMany(labels.length, "value"))} without an origin.</strong> The revision will list them:
      </p>
      <p className="mt-1 max-h-28 overflow-y-auto text-13 text-quiet">{labels.join(", ")}</p>
    </div>
  );
}

function FreezeFailure({ error }: { error: Error }) {
  const fields = error instanceof ApiFailure ? error.fields : [];
  return (
    <ErrorNote className="mt-4">
      <p>{error.message}</p>
      {fields.length > 0 && (
        <ul className="mt-2 list-disc pl-5 text-13">
          {fields.map(({ path, message }) => (
            <li key={path + message}>{message}</li>
          ))}
        </ul>
      )}
    </ErrorNote>
  );
}
