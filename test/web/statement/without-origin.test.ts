import { pathsWithoutOrigin } from "@restband/solver";
import { expect, it } from "vitest";
import { startingPoints } from "../../../web/src/features/starting-points/index.ts";
import { groups } from "../../../web/src/features/statement/groups.ts";
import { withoutOrigin } from "../../../web/src/features/statement/origin/without-origin.tsx";

it.each(startingPoints)("names each value as its field does and leads to a place of the statement, $key", (point) => {
  const scenario = { ...point.scenario, origins: {} };
  const told = groups.flatMap(({ sentence }) => sentence(scenario));
  const places = new Set(told.flatMap((piece) => ("path" in piece ? [piece.path] : [])));
  const listed = withoutOrigin(scenario);
  expect(listed.map(({ path }) => path)).toEqual(pathsWithoutOrigin(scenario));
  for (const { path, label } of listed) {
    expect(places).toContain(path);
    expect(label).not.toBe(path);
  }
});
