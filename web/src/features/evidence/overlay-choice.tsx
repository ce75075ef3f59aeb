import { PlainSelect } from "../../components/select.tsx";
import { Option } from "./option.tsx";
import type { ScenarioOverlay } from "./use-scenario-overlay.ts";

/** Which other scenario is drawn over this one. */
export function OverlayChoice({ overlay }: { overlay: ScenarioOverlay }) {
  const { isOpen, open, others, chosen, choose, trouble } = overlay;
  if (!isOpen)
    return (
      <span className="text-13">
        <Option label="overlay a scenario" onChoose={open} />
      </span>
    );
  return (
    <span className="flex flex-wrap items-center gap-x-2 text-13">
      <span className="text-quiet">overlay</span>
      <PlainSelect
        isQuiet
        autoFocus
        aria-label="Scenario to overlay"
        choices={[
          { value: "", label: "none" },
          ...others.map(({ id, title }) => ({ value: id, label: title || "Untitled" })),
        ]}
        value={chosen}
        onChange={(event) => choose(event.target.value)}
      />
      {trouble && <span role="status">{trouble}</span>}
    </span>
  );
}
