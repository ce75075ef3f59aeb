import type { Integrity, Replay, Revision } from "@restband/api/contract";
import type { ReactNode } from "react";
import { StateMark } from "../../components/state-mark.tsx";
import { VerdictMark } from "../../components/verdict-mark.tsx";
import { sayMoment } from "../../format/when.ts";
import { RevisionMark } from "./revision-mark.tsx";

interface TitleBlockProps {
  revision: Revision;
  /** Newest first; undefined until they are read. */
  replays: readonly Replay[] | undefined;
  /** Undefined until it is read. */
  integrity: Integrity | undefined;
}

/** What stands at the head of a drawing: number, date, who prepared it, who replayed it, how it stands, digest and seal. */
export function TitleBlock({ revision, replays, integrity }: TitleBlockProps) {
  const { number, frozenAt, frozenBy, state, decided, digest, result, isRecomputed, isSensitive } = revision;
  const last = replays?.[0];
  return (
    <dl className="grid w-full max-w-[400px] grid-cols-[auto_minmax(0,1fr)] content-start self-start rounded border-[1.5px] border-ink bg-raised">
      <div className="border-b border-line px-3.5 py-2">
        <dt className="text-13 text-quiet">revision</dt>
        <dd className="text-24 leading-tight font-bold">{number}</dd>
      </div>
      <div className="border-b border-l border-line px-3.5 py-2">
        <dt className="text-13 text-quiet">frozen</dt>
        <dd className="font-bold">
          <time dateTime={frozenAt}>{sayMoment(new Date(frozenAt))}</time>
        </dd>
      </div>
      <Line name="prepared">{frozenBy.name}</Line>
      <Line name="computed">
        solver {result.solverVersion}, {result.method}
        <span className="block text-13 text-quiet">{serverWords(isRecomputed, isSensitive)}</span>
      </Line>
      <Line name="replayed">
        {last ? (
          <>
            {last.by.name} <VerdictMark verdict={last.verdict} className="float-right" />
          </>
        ) : (
          <span className="text-quiet">{replays ? "not yet" : ""}</span>
        )}
      </Line>
      <Line name="decision">
        <RevisionMark state={state} />
        {decided && (
          <span className="block text-13 text-quiet">
            {decided.by.name}, {sayMoment(new Date(decided.at))}
          </span>
        )}
      </Line>
      <Line name="digest">
        <code className="figures text-13 wrap-anywhere" title={digest}>
          {grouped(digest.slice(0, 16))}
        </code>
      </Line>
      <Line name="seal" isLast>
        {integrity ? <Seal integrity={integrity} isSound={revision.faults.length === 0} /> : null}
      </Line>
    </dl>
  );
}

function serverWords(isRecomputed: boolean, isSensitive: boolean): string {
  if (!isRecomputed) return "not recomputed by the server: it took longer than 20 s";
  return isSensitive
    ? "recomputed by the server: sensitive, not reproducible to the last digits"
    : "recomputed by the server, which agrees";
}

function Line({ name, isLast, children }: { name: string; isLast?: boolean; children: ReactNode }) {
  return (
    <div className={isLast ? lineClass : `${lineClass} border-b border-line`}>
      <dt className="text-13/[22px] text-quiet">{name}</dt>
      <dd className="min-w-0 font-semibold">{children}</dd>
    </div>
  );
}

const lineClass = "col-span-2 grid grid-cols-[72px_minmax(0,1fr)] gap-x-3 px-3.5 py-1.5";

/** Whether the row and the chain of the project are as they were written, and the key they are signed with. */
function Seal({ integrity: { isWhole, fingerprint }, isSound }: { integrity: Integrity; isSound: boolean }) {
  const [word, tone] = !isSound
    ? (["broken: see above", "broken"] as const)
    : isWhole
      ? (["signed, the trail is whole", "kept"] as const)
      : (["signed, the trail is damaged", "broken"] as const);
  return (
    <>
      <StateMark word={word} tone={tone} />
      <code className="figures block text-13 font-normal text-quiet" title={fingerprint}>
        key {grouped(fingerprint.slice(0, 16))}
      </code>
    </>
  );
}

const grouped = (text: string): string => text.replace(/(.{4})(?=.)/gu, "$1 ");
