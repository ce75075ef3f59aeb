import { useState } from "react";
import { Button } from "../../../components/button.tsx";
import { TextArea } from "../../../components/text-field.tsx";
import { readFit, type FitReading } from "./fit-reading.ts";

interface PasteFitProps {
  /** How many values it is to be of. */
  count: number;
  onFit: (fit: FitReading) => void;
}

/** Takes over what a fit has left: its estimates and its covariance, as programs print them. */
export function PasteFit({ count, onFit }: PasteFitProps) {
  const [text, setText] = useState("");
  const [fault, setFault] = useState<string>();
  const take = (): void => {
    const read = readFit(text, count);
    if ("message" in read) return setFault(read.message);
    setFault(undefined);
    onFit(read);
  };
  return (
    <details>
      <summary className="link w-fit text-15">Paste a fit</summary>
      <TextArea
        label="Estimates, then their covariance row by row"
        className="mt-3 max-w-[560px]"
        help="In the order and in the units of the means above. Brackets, commas and line ends may stand between the numbers."
        rows={4}
        value={text}
        error={fault}
        spellCheck={false}
        onChange={(event) => setText(event.target.value)}
      />
      <Button className="mt-3" onClick={take}>
        Take it over
      </Button>
    </details>
  );
}
