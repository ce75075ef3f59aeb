import { classNames } from "../../components/class-names.ts";
import { Figure } from "../../components/figure.tsx";
import type { Frame } from "./frame.ts";
import type { Overlay } from "./overlay.ts";
import { overlayReading, readingsAt, type CursorReading } from "./readings.ts";
import type { RunView } from "./run-view.ts";

const tones: Record<CursorReading["tone"], string> = {
  slip: "text-slip",
  quiet: "text-quiet",
  ink: "text-ink",
  band: "text-band-line",
  stick: "text-stick",
};

interface GutterProps {
  view: RunView;
  frame: Frame;
  t: number;
  overlays: readonly Overlay[];
}

/** The values at the cursor beside their panels, in the colours of their curves. */
export function Gutter({ view, frame, t, overlays }: GutterProps) {
  const readings = readingsAt(view, frame, t, overlays);
  return frame.panels.map(({ key, top }) => (
    <dl key={key} className="absolute" style={{ top: top - 6, left: frame.width - frame.right + 20, right: 8 }}>
      {readings[key].map((reading) => (
        <ReadingItem key={reading.name} reading={reading} className="mb-1" />
      ))}
    </dl>
  ));
}

/** On the phone: the first value of each panel, above the plots, and below them those of what is compared. */
export function ReadingsRow({ view, frame, t, overlays }: GutterProps) {
  const { displacement, velocity, friction } = readingsAt(view, frame, t);
  const others = overlays.flatMap((overlay) =>
    (["x", "v"] as const).flatMap((channel) => {
      const reading = overlayReading(view, frame, t, overlay, channel);
      return reading ? [{ key: `${overlay.key} ${channel}`, channel, reading }] : [];
    }),
  );
  return (
    <dl className="mb-3 grid grid-cols-3 gap-3">
      {[displacement[0], velocity[0], friction[0]].map((reading) => (
        <ReadingItem key={reading.name} reading={reading} />
      ))}
      {others.map(({ key, channel, reading }) => (
        <ReadingItem key={key} reading={reading} className={channel === "x" ? "col-start-1" : "col-start-2"} />
      ))}
    </dl>
  );
}

function ReadingItem({ reading, className }: { reading: CursorReading; className?: string }) {
  return (
    <div className={classNames("leading-[1.25]", className)}>
      <dt className={classNames("truncate text-13 font-semibold", tones[reading.tone])}>{reading.name}</dt>
      <dd className={classNames("text-18 font-semibold", tones[reading.tone])}>
        <Figure {...reading} />
      </dd>
    </div>
  );
}
