import { Button } from "../../components/button.tsx";
import { Icon } from "../../components/icon.tsx";
import { PlainSelect } from "../../components/select.tsx";
import { paces, type Pace, type Play } from "./use-play.ts";

interface PlayButtonsProps {
  play: Play;
  onStep: (direction: 1 | -1) => void;
  /** On the phone the docked strip has the steps. */
  hasSteps: boolean;
}

/** Event before, play, next event, and how fast it plays. */
export function PlayButtons({ play, onStep, hasSteps }: PlayButtonsProps) {
  return (
    <span className="flex items-center gap-2">
      {hasSteps && (
        <Button className="w-8 px-0!" aria-label="Event before" onClick={() => onStep(-1)}>
          <Icon name="previous" size={13} />
        </Button>
      )}
      <Button
        className="w-8 px-0! max-desk:size-11"
        aria-label={play.isPlaying ? "Pause" : "Play"}
        onClick={play.toggle}
      >
        <Icon name={play.isPlaying ? "pause" : "play"} size={13} />
      </Button>
      {hasSteps && (
        <Button className="w-8 px-0!" aria-label="Next event" onClick={() => onStep(1)}>
          <Icon name="next" size={13} />
        </Button>
      )}
      <PlainSelect
        isQuiet
        aria-label="Plays what is seen"
        choices={paces}
        value={play.pace}
        onChange={(event) => play.setPace(event.target.value as Pace)}
      />
    </span>
  );
}
