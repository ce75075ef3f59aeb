import { edgePlace, type EdgePlace, type MapEdge } from "./map-edges.ts";

/**
 * Edges joined to lines: two of one square of four cells belong together where they part the same two sides. Where all four
 * do, the lines cut off two of its corners. Where three sides meet, lines end at the square.
 */
export function joinedEdges<Side>(edges: readonly MapEdge<Side>[]): MapEdge<Side>[][] {
  const byPlace = new Map(edges.map((edge): [EdgePlace, MapEdge<Side>] => [edge.place, edge]));
  const beside = neighboursOf(edges, byPlace);
  const left = new Set(edges);
  const ends = edges.filter((edge) => (beside.get(edge) ?? []).length < 2);
  return [...ends, ...edges].flatMap((start) => (left.has(start) ? [lineFrom(start, beside, left)] : []));
}

type Neighbours<Side> = ReadonlyMap<MapEdge<Side>, readonly MapEdge<Side>[]>;

/** Goes on from an edge as long as there is one; a line that comes back to where it started is closed. */
function lineFrom<Side>(start: MapEdge<Side>, beside: Neighbours<Side>, left: Set<MapEdge<Side>>): MapEdge<Side>[] {
  const line: MapEdge<Side>[] = [];
  for (let edge: MapEdge<Side> | undefined = start; edge;) {
    line.push(edge);
    left.delete(edge);
    edge = beside.get(edge)?.find((next) => left.has(next));
  }
  const isClosed = line.length > 2 && beside.get(line[line.length - 1])?.includes(start);
  return isClosed ? [...line, start] : line;
}

function neighboursOf<Side>(
  edges: readonly MapEdge<Side>[],
  byPlace: ReadonlyMap<EdgePlace, MapEdge<Side>>,
): Neighbours<Side> {
  const beside = new Map<MapEdge<Side>, MapEdge<Side>[]>();
  const join = (a: MapEdge<Side>, b: MapEdge<Side>): void => {
    beside.set(a, [...(beside.get(a) ?? []), b]);
    beside.set(b, [...(beside.get(b) ?? []), a]);
  };
  for (const square of new Set(edges.flatMap(squaresOf))) {
    const [column, row] = square.split(" ").map(Number);
    const around = edgesAround(column, row).flatMap((place) => byPlace.get(place) ?? []);
    for (const like of groupsOf(around)) for (let i = 0; i + 1 < like.length; i += 2) join(like[i], like[i + 1]);
  }
  return beside;
}

/** The two squares an edge lies between, by their lower left cells; at the rim of the map one of them holds no other edge. */
const squaresOf = ({ axis, column, row }: MapEdge<unknown>): string[] =>
  axis === 0 ? [`${column} ${row}`, `${column} ${row - 1}`] : [`${column} ${row}`, `${column - 1} ${row}`];

/** The edges of a square of cells, one after another around it. */
const edgesAround = (column: number, row: number): EdgePlace[] => [
  edgePlace(0, column, row),
  edgePlace(1, column + 1, row),
  edgePlace(0, column, row + 1),
  edgePlace(1, column, row),
];

/** Edges that part the same two sides, in their order. */
function groupsOf<Side>(edges: readonly MapEdge<Side>[]): MapEdge<Side>[][] {
  const groups: MapEdge<Side>[][] = [];
  for (const edge of edges) {
    const group = groups.find(
      ([one]) => [one.from, one.to].includes(edge.from) && [one.from, one.to].includes(edge.to),
    );
    if (group) group.push(edge);
    else groups.push([edge]);
  }
  return groups;
}
