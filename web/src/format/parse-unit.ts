import { loadOtherUnits, otherUnits } from "./other-units.ts";
import type { Measure, Unit } from "./unit.ts";
import { unitsOf } from "./units.ts";

// Whoever reads units may soon meet one that is not ours.
void loadOtherUnits();

/** A typed unit in one spelling: "m/s^2", "N·s/m" and "um" as "m/s²", "N·s/m" and "μm" are written on the screen. */
function spelled(text: string): string {
  return text
    .trim()
    .replace(/\s*([/*·.×])\s*/g, (_, sign: string) => (sign === "/" ? "/" : "·"))
    .replace(/\s+/g, "·")
    .replace(/\^?2(?!\d)/g, "²")
    .replace(/\^?3(?!\d)/g, "³")
    .replace(/µ/g, "μ")
    .replace(/(^|[/·])u(?=m|s|rad|N)/g, "$1μ");
}

/**
 * The unit a person typed behind a number: one of the dimension's own, or any other that measures the same
 * ("ft", "kN/m"). Null where it is no unit, or measures something else; also where the library of other units is not there
 * yet.
 */
export function parseUnit(typed: string, measure: Measure): Unit | null {
  const wanted = spelled(typed);
  const units = unitsOf(measure);
  const known = units.find((unit) => namesOf(unit).includes(wanted));
  if (known) return known;
  const folded = units.filter((unit) => namesOf(unit).some((name) => name.toLowerCase() === wanted.toLowerCase()));
  return folded.length === 1 ? folded[0] : foreignUnit(wanted, measure);
}

const namesOf = (unit: Unit): string[] => [unit.label, ...(unit.aliases ?? [])];

/** Any other unit, by the library's tables; the factor is theirs. */
function foreignUnit(wanted: string, measure: Measure): Unit | null {
  const reference = unitsOf(measure).find((unit) => unit.factor === 1);
  const convert = otherUnits();
  if (!convert || !reference || reference.label === "") return null;
  try {
    const factor = convert(librarySpelling(wanted), librarySpelling(reference.label));
    return Number.isFinite(factor) && factor > 0 ? { label: wanted, factor } : null;
  } catch {
    return null; // the library throws for unknown and for incompatible units alike
  }
}

function librarySpelling(label: string): string {
  return label
    .replaceAll("·", "*")
    .replaceAll("²", "^2")
    .replaceAll("³", "^3")
    .replaceAll("°", "deg")
    .replaceAll("μ", "u");
}
