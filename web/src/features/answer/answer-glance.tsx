import { MotionStrip } from "../../components/motion-strip.tsx";
import type { Computed } from "../../compute/use-run.ts";
import { say } from "../../format/format-quantity.ts";
import { answerSentence, shortAnswer } from "./answer-sentence.ts";
import { useStrip } from "./answer.tsx";
import { Verdict } from "../../components/verdict.tsx";

/** The motion of a run in a row of a list, with how long it is. */
export function StripGlance({ computed }: { computed: Computed }) {
  const strip = useStrip(computed);
  if (!strip) return null;
  const words = say(strip.to, { dimension: "time", motion: "linear" });
  return (
    <>
      <MotionStrip {...strip} label={`Motion over ${words}`} />
      <p className="figures mt-1 text-13 text-quiet">{words}</p>
    </>
  );
}

/** The answer of a run in a row of a list. */
export function SentenceGlance({ computed }: { computed: Computed }) {
  if ("refusal" in computed) return <p className="text-quiet">Not computed by this version.</p>;
  const sentence = answerSentence(computed.scenario, computed.result);
  const { verdict, after } = shortAnswer(sentence);
  return (
    <p>
      <Verdict outcome={sentence.outcome}>{verdict}</Verdict>
      {after}
    </p>
  );
}
