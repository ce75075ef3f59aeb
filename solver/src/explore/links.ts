import { variablePaths } from "../scenario/numeric-fields.ts";
import { ownMember } from "../scenario/own-member.ts";
import { numberAt, withNumber } from "../scenario/path.ts";
import type { Fault, Scenario } from "../scenario/scenario.ts";
import { quoted } from "../scenario/sentences.ts";
import { z } from "../scenario/zod.ts";

/**
 * How a number follows others that are varied: `factor` × the number at `of`; `body.viscous` so that ζ = c/(2√(km)) stays as
 * entered; `span.seconds` so that the run lasts as many periods of its lowest input frequency.
 */
export type Link = { readonly of: string; readonly factor: number } | { readonly keep: "dampingRatio" | "periods" };

/** Numbers that follow, by path. A number followed must not itself follow. */
export type Links = Readonly<Record<string, Link>>;

const keeps = { dampingRatio: "body.viscous", periods: "span.seconds" } as const;

const linkSchema = z.union([
  z.strictObject({ of: z.string(), factor: z.number() }),
  z.strictObject({ keep: z.enum(["dampingRatio", "periods"]) }),
]);
export const linksSchema: z.ZodType<Links> = z.record(z.string(), linkSchema);

/**
 * The links that hold unless others are given: where one friction coefficient of a law with μs and μk is varied alone, the
 * other keeps the ratio entered. Empty where both are varied, where they are no pair, and where a ratio has no value.
 */
export function defaultLinks(scenario: Scenario, varied: readonly string[]): Links {
  const { law } = scenario.contact;
  if (!("static" in law)) return {};
  const [fixed, sliding] = ["contact.law.static", "contact.law.kinetic"];
  const isVaried = [varied.includes(fixed), varied.includes(sliding)];
  if (isVaried[0] === isVaried[1]) return {};
  const [of, follows] = isVaried[0] ? [fixed, sliding] : [sliding, fixed];
  const factor = numberAt(scenario, follows) / numberAt(scenario, of);
  return Number.isFinite(factor) ? { [follows]: { of, factor } } : {};
}

/** Faults of links, at `links.<path>`: both ends are numbers of the scenario, none follows what follows, none is varied itself. */
export function linkFaults(links: unknown, scenario: Scenario, varied: readonly string[]): Fault[] {
  if (typeof links !== "object" || links === null || Array.isArray(links))
    return [{ path: "links", message: `Links are an object by path; it is ${quoted(links)}.` }];
  const paths = new Set(variablePaths(scenario));
  return Object.entries(links).flatMap(([path, link]) => {
    const message = linkFault(path, link, { scenario, paths, varied, links });
    return message === null ? [] : [{ path: `links.${path}`, message }];
  });
}

interface Around {
  readonly scenario: Scenario;
  readonly paths: ReadonlySet<string>;
  readonly varied: readonly string[];
  readonly links: object;
}

function linkFault(path: string, link: unknown, { scenario, paths, varied, links }: Around): string | null {
  if (!paths.has(path)) return `This scenario has no number called ${quoted(path)}.`;
  if (varied.includes(path)) return "This number is varied itself, so it cannot follow another.";
  const keep = ownMember(link, "keep");
  if (keep === "dampingRatio" || keep === "periods") return keepFault(path, keep, scenario);
  const of = ownMember(link, "of");
  if (!paths.has(of as string) || !Number.isFinite(ownMember(link, "factor")))
    return 'A link is {"of": a number of the scenario, "factor": a number}, {"keep": "dampingRatio"} or {"keep": "periods"}.';
  return of === path || Object.hasOwn(links, of as string) ? "A number cannot follow one that itself follows." : null;
}

function keepFault(path: string, keep: keyof typeof keeps, scenario: Scenario): string | null {
  if (keep === "dampingRatio") {
    if (path !== keeps[keep]) return "Only the viscous damping can keep the damping ratio.";
    return scenario.body.stiffness > 0 ? null : "Without a spring there is no damping ratio to keep.";
  }
  if (path !== keeps[keep]) return "Only the length of the run can keep the number of periods.";
  return hzPaths(scenario).length > 0
    ? null
    : "Nothing drives the body at a frequency, so there are no periods to keep.";
}

/** The frequencies of steady harmonic inputs. */
function hzPaths({ force, base }: Scenario): string[] {
  return Object.entries({ force, base }).flatMap(([place, terms]) =>
    terms.flatMap(({ kind }, i) => (kind === "harmonic" || kind === "unbalance" ? [`${place}[${i}].hz`] : [])),
  );
}

/** The values that follow, by path, once `read` tells those varied. @param base the scenario as entered */
export function linkedValues(base: Scenario, links: Links, read: (path: string) => number): [string, number][] {
  return Object.entries(links).map(([path, link]) => [
    path,
    "of" in link ? link.factor * read(link.of) : keepers[link.keep](base, read),
  ]);
}

type Keeper = (base: Scenario, read: (path: string) => number) => number;

const keepers: Readonly<Record<keyof typeof keeps, Keeper>> = {
  dampingRatio: ({ body }, read) => {
    const grown = (read("body.stiffness") / body.stiffness) * (read("body.inertia") / body.inertia);
    return body.viscous * Math.sqrt(grown);
  },
  periods: (base, read) => {
    const lowest = (at: (path: string) => number) => Math.min(...hzPaths(base).map(at));
    return (base.span.seconds * lowest((path) => numberAt(base, path))) / lowest(read);
  },
};

/** The scenario with other numbers at some paths, and those that follow them. */
export function withValues(base: Scenario, values: readonly (readonly [string, number])[], links: Links): Scenario {
  const set = (scenario: Scenario, list: readonly (readonly [string, number])[]) =>
    list.reduce((at, [path, value]) => withNumber(at, path, value), scenario);
  const varied = set(base, values);
  return set(
    varied,
    linkedValues(base, links, (path) => numberAt(varied, path)),
  );
}
