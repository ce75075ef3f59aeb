import { useMemo } from "react";
import { classNames } from "./class-names.ts";
import { stripShapes, type StripInterval } from "./strip-shapes.ts";
import { useWidth } from "./use-width.ts";

interface MotionStripProps {
  intervals: readonly StripInterval[];
  /** Time at the left and right end. */
  from: number;
  to: number;
  /** What the strip tells, for those who cannot see it. */
  label: string;
  height?: number;
  /** A body that never moves: dots instead of stripes. */
  isNever?: boolean;
  className?: string;
}

/** Slip forward above the line, slip back below it, stick hatched across it. As wide as its place; patterns never scale. */
export function MotionStrip({ intervals, from, to, label, height = 20, isNever, className }: MotionStripProps) {
  const [ref, width] = useWidth<SVGSVGElement>(188);
  const shapes = useMemo(
    () => stripShapes(intervals, { from, to, width, height }),
    [intervals, from, to, width, height],
  );
  return (
    <svg
      ref={ref}
      role="img"
      aria-label={label}
      width="100%"
      height={height}
      className={classNames("block forced-color-adjust-none", className)}
    >
      {isNever ? (
        // Whole rows of the dots' own grid.
        <rect y={6} width={width} height={12} fill="url(#hatch-never)" />
      ) : (
        <>
          <path d={`M0 ${height / 2}H${width}`} className="stroke-edge" strokeWidth={1} />
          <path d={shapes.stick} fill="url(#hatch-stick)" />
        </>
      )}
      <path d={shapes.back} fill="url(#hatch-back)" className="stroke-slip" strokeWidth={0.75} />
      <path d={shapes.forward} className="fill-slip" />
    </svg>
  );
}
