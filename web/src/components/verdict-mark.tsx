import { StateMark } from "./state-mark.tsx";

const verdicts = {
  agrees: { word: "agrees", tone: "kept", says: "Every quantity and event is within what is allowed." },
  differs: { word: "differs", tone: "broken", says: "Something is not the same." },
  sensitive: {
    word: "sensitive",
    tone: "quiet",
    says: "Not reproducible to this precision: inputs moved by 10⁻¹² of themselves move the run as much.",
  },
} as const;

/** What `sensitive` means, for those who cannot point at it. */
export const sensitiveWords = verdicts.sensitive.says;

interface VerdictMarkProps {
  readonly verdict: keyof typeof verdicts;
  readonly className?: string;
}

/** What came of running something again. */
export function VerdictMark({ verdict, className }: VerdictMarkProps) {
  return <StateMark {...verdicts[verdict]} className={className} />;
}
