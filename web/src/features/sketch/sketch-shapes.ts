/** A point of a drawing, CSS pixels, y down. */
export type Point = readonly [x: number, y: number];

/** Colours by what they mean; each is a token of the look. */
export type Tone = "ink" | "quiet" | "slip" | "stick" | "band";

/** Fills: the ground of the page, a solid of its own tone, or one of the page's hatches. */
export type Fill = "none" | "raised" | "solid" | "hatch-ground" | "hatch-band";

export type Shape =
  | {
      readonly kind: "line";
      readonly points: readonly Point[];
      readonly tone: Tone;
      readonly width: number;
      readonly isDashed?: boolean;
    }
  | {
      readonly kind: "area";
      readonly points: readonly Point[];
      readonly tone: Tone;
      readonly width: number;
      readonly fill: Fill;
    }
  | {
      readonly kind: "disc";
      readonly centre: Point;
      readonly radius: number;
      readonly tone: Tone;
      readonly width: number;
      readonly fill: Fill;
    }
  | { readonly kind: "arrow"; readonly from: Point; readonly to: Point; readonly tone: Tone }
  | Label;

export interface Label {
  readonly kind: "label";
  /** Middle of the text's height; across by `anchor`. */
  readonly at: Point;
  readonly text: string;
  readonly tone: Tone;
  readonly anchor: "start" | "middle" | "end";
  readonly isBold?: boolean;
  readonly isFigure?: boolean;
}

export interface Box {
  readonly left: number;
  readonly top: number;
  readonly right: number;
  readonly bottom: number;
}

/** Mean advance of a sign of the 13 px text, measured on the labels of this sketch; figures and bold are wider. */
const advance = ({ isBold, isFigure }: Label): number => (isFigure ? 9 : isBold ? 7.2 : 6.7);

/** The room a label takes, as near as it can be told without the page. */
export function labelBox(label: Label): Box {
  const width = label.text.length * advance(label);
  const [x, y] = label.at;
  const left = label.anchor === "start" ? x : label.anchor === "end" ? x - width : x - width / 2;
  return { left, right: left + width, top: y - 8, bottom: y + 8 };
}

/** The box around all shapes. */
export function boundsOf(shapes: readonly Shape[]): Box {
  const boxes = shapes.map(boxOf);
  return {
    left: Math.min(...boxes.map(({ left }) => left)),
    top: Math.min(...boxes.map(({ top }) => top)),
    right: Math.max(...boxes.map(({ right }) => right)),
    bottom: Math.max(...boxes.map(({ bottom }) => bottom)),
  };
}

function boxOf(shape: Shape): Box {
  switch (shape.kind) {
    case "label":
      return labelBox(shape);
    case "disc": {
      const [x, y] = shape.centre;
      const { radius } = shape;
      return { left: x - radius, right: x + radius, top: y - radius, bottom: y + radius };
    }
    case "arrow":
      return around([shape.from, shape.to]);
    default:
      return around(shape.points);
  }
}

function around(points: readonly Point[]): Box {
  const [xs, ys] = [points.map(([x]) => x), points.map(([, y]) => y)];
  return { left: Math.min(...xs), right: Math.max(...xs), top: Math.min(...ys), bottom: Math.max(...ys) };
}

/** The same shapes, moved. */
export function moved(shapes: readonly Shape[], dx: number, dy: number): Shape[] {
  const by = ([x, y]: Point): Point => [x + dx, y + dy];
  return shapes.map((shape): Shape => {
    switch (shape.kind) {
      case "label":
        return { ...shape, at: by(shape.at) };
      case "disc":
        return { ...shape, centre: by(shape.centre) };
      case "arrow":
        return { ...shape, from: by(shape.from), to: by(shape.to) };
      default:
        return { ...shape, points: shape.points.map(by) };
    }
  });
}
