import { Option } from "./option.tsx";
import type { Extra } from "./use-panels.ts";

interface PanelChoiceProps {
  hasDrive: boolean;
  chosen: readonly Extra[];
  onToggle: (panel: Extra) => void;
}

/** Which figures stand beside the usual ones. */
export function PanelChoice({ hasDrive, chosen, onToggle }: PanelChoiceProps) {
  const option = (panel: Extra, label: string) => (
    <Option label={label} isChosen={chosen.includes(panel)} onChoose={() => onToggle(panel)} />
  );
  return (
    <div className="flex flex-wrap items-center gap-x-3 text-13" role="group" aria-label="More plots">
      <span className="text-quiet">also</span>
      {option("acceleration", "acceleration")}
      {hasDrive && option("drive", "drive force")}
      {option("spectrum", "spectrum")}
    </div>
  );
}
