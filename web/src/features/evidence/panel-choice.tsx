import type { ExtraPanel } from "./frame.ts";
import { Option } from "./option.tsx";

interface PanelChoiceProps {
  hasDrive: boolean;
  chosen: readonly ExtraPanel[];
  onToggle: (panel: ExtraPanel) => void;
}

/** Which panels stand beside the usual three. */
export function PanelChoice({ hasDrive, chosen, onToggle }: PanelChoiceProps) {
  return (
    <div className="flex items-center gap-x-3 text-13" role="group" aria-label="More panels">
      <span className="text-quiet">also</span>
      <Option
        label="acceleration"
        isChosen={chosen.includes("acceleration")}
        onChoose={() => onToggle("acceleration")}
      />
      {hasDrive && (
        <Option label="drive force" isChosen={chosen.includes("drive")} onChoose={() => onToggle("drive")} />
      )}
    </div>
  );
}
