import type { Integrity } from "@restband/api/contract";
import { useQuery } from "@tanstack/react-query";
import { integrityQuery } from "../../api/revisions.ts";
import { StateMark } from "../../components/state-mark.tsx";
import { sayMany } from "../../format/words.ts";

const MOST = 5;

/** Whether the project's trail is as it was written, and with which key it is signed. */
export function TrailSeal({ projectId }: { projectId: string }) {
  const { data: integrity } = useQuery(integrityQuery(projectId));
  if (!integrity) return null;
  return (
    <div className="mt-4 border-t border-line pt-3 text-13" aria-label="State of the trail" role="group">
      {integrity.isWhole ? (
        <StateMark
          word="The trail is whole."
          tone="kept"
          says={`${integrity.rows} rows, each bound to the one before`}
        />
      ) : (
        <Damage integrity={integrity} />
      )}
      <p className="mt-1 text-quiet">
        Signed with the key{" "}
        <code className="figures wrap-anywhere" title={integrity.fingerprint}>
          {(integrity.fingerprint.slice(0, 16).match(/.{4}/gu) ?? []).join(" ")}
        </code>
      </p>
      {!integrity.isGuarded && (
        <p className="mt-1">The database does not guard it: one account of the database does everything.</p>
      )}
    </div>
  );
}

function Damage({ integrity: { faults } }: { integrity: Integrity }) {
  return (
    <>
      <StateMark word={`The trail is damaged at ${sayMany(faults.length, "place")}.`} tone="broken" />
      <ul className="mt-1 flex flex-col gap-1">
        {faults.slice(0, MOST).map(({ table, id, sequence, message }) => (
          <li key={`${table} ${sequence} ${message}`} className="wrap-anywhere">
            <strong>
              {table}, row {sequence}
            </strong>{" "}
            {message} {id && <span className="figures text-quiet">{id}</span>}
          </li>
        ))}
      </ul>
    </>
  );
}
