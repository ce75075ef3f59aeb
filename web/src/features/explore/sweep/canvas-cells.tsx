import { cellOutcomes } from "@restband/solver";
import { useEffect, useRef } from "react";
import { usePlotTheme, type PlotTheme } from "../../../components/plot-theme.ts";
import type { SweepCells } from "./sweep-cells.ts";
import { cornerOf, type MapFrame } from "./map-frame.ts";
import { outcomeMarks, verdictMarks, type OutcomeMark } from "./outcome-marks.ts";
import { rampColours } from "./colour-ramp.ts";
import { shareOn, type Shown } from "./shown.ts";

interface CanvasCellsProps {
  cells: SweepCells;
  frame: MapFrame;
  first: number;
  shown: Shown;
  edition: number;
}

/** Many cells on one canvas: pattern and colour of the outcome, or the colour of a value. */
export function CanvasCells({ cells, frame, first, shown, edition }: CanvasCellsProps) {
  const canvas = useRef<HTMLCanvasElement>(null);
  const theme = usePlotTheme();
  useEffect(() => {
    const context = canvas.current?.getContext("2d");
    if (!canvas.current || !context) return;
    const ratio = Math.min(2, window.devicePixelRatio || 1);
    canvas.current.width = frame.width * ratio;
    canvas.current.height = frame.height * ratio;
    context.scale(ratio, ratio);
    const paint = paintOf(context, cells, shown, theme);
    for (let i = 0; i < frame.columns * frame.rows; i++) {
      const fill = paint(first + i);
      if (fill === null) continue;
      const { x, y } = cornerOf(frame, i % frame.columns, Math.floor(i / frame.columns));
      context.fillStyle = fill;
      // To the next whole pixel, so that no seam shows between neighbours.
      context.fillRect(Math.floor(x), Math.floor(y), Math.ceil(frame.cellWidth), Math.ceil(frame.cellHeight));
    }
  }, [cells, frame, first, shown, theme, edition]);
  return (
    <canvas
      ref={canvas}
      aria-hidden="true"
      className="absolute inset-0 forced-color-adjust-none"
      style={{ width: frame.width, height: frame.height }}
    />
  );
}

type Paint = (cell: number) => string | CanvasPattern | null;

function paintOf(context: CanvasRenderingContext2D, cells: SweepCells, shown: Shown, theme: PlotTheme): Paint {
  if (shown.kind === "outcome") {
    const patterns = cellOutcomes.map((outcome) => patternOf(context, outcomeMarks[outcome], theme));
    return (cell) => {
      const code = cells.code(cell);
      return code === null || code < 0 ? null : patterns[code];
    };
  }
  if (shown.kind === "limit") {
    const [kept, broken] = [verdictMarks.kept, verdictMarks.broken].map((mark) => patternOf(context, mark, theme));
    return (cell) => {
      const isKept = cells.kept(cell, shown.limit);
      return isKept === null ? null : isKept ? kept : broken;
    };
  }
  const colours = rampColours(theme);
  return (cell) => {
    const value = cells.quantity(cell, shown.place);
    return value === null
      ? null
      : colours[Math.min(colours.length - 1, Math.floor(shareOn(shown, value) * colours.length))];
  };
}

/** A tile of the same drawing that the page's patterns have. */
function patternOf(
  context: CanvasRenderingContext2D,
  { token, hatch }: OutcomeMark,
  theme: PlotTheme,
): string | CanvasPattern {
  const colour = theme[token];
  if (hatch === "plain") return colour;
  const size = hatch === "dots" || hatch === "diagonal" ? 6 : 8;
  const tile = document.createElement("canvas");
  tile.width = tile.height = size;
  const pen = tile.getContext("2d");
  if (!pen) return colour;
  pen.strokeStyle = pen.fillStyle = colour;
  pen.lineWidth = 1.4;
  pen.beginPath();
  if (hatch === "dots") pen.arc(size / 2, size / 2, 1, 0, 7);
  if (hatch === "diagonal" || hatch === "cross")
    for (const shift of [-size, 0, size]) {
      pen.moveTo(shift, size);
      pen.lineTo(shift + size, 0);
      if (hatch === "cross") {
        pen.moveTo(shift, 0);
        pen.lineTo(shift + size, size);
      }
    }
  if (hatch === "lines") {
    pen.moveTo(0, 2);
    pen.lineTo(size, 2);
    pen.moveTo(0, 6);
    pen.lineTo(size, 6);
  }
  if (hatch === "waves") {
    pen.moveTo(0, size / 2);
    pen.quadraticCurveTo(size / 4, 0, size / 2, size / 2);
    pen.quadraticCurveTo((3 * size) / 4, size, size, size / 2);
  }
  if (hatch === "dots") pen.fill();
  else pen.stroke();
  return context.createPattern(tile, "repeat") ?? colour;
}
