import type { Field } from "../field.ts";
import * as fields from "./fields.ts";
import { lawBlock, solidBlock, termBlock } from "./kind-blocks.ts";
import { lenientReading } from "./lenient-reading.ts";
import { quantityNames } from "./quantity-names.ts";
import { type Block, choiceOf, memberOf, membersOf, type Reading } from "./reading.ts";
import { originKinds, purposes, type Scenario } from "./scenario.ts";
import { strictReading } from "./strict-reading.ts";
import type { z } from "./zod.ts";

/*
 * The shape of `restband-scenario/1`: members, words and bounds of single numbers, with defaults written out. What takes
 * more than one member to judge is in `rules.ts`.
 */

/** Refuses what is faulty; every fault says where and what is asked. */
export const scenarioSchema = scenarioBlock(strictReading) as z.ZodType<Scenario>;

/** What can be read of a faulty scenario; never refuses. See `lenientReading`. */
export const draftSchema = scenarioBlock(lenientReading) as z.ZodType<Scenario>;

/** The blocks are made from lists: the compiler cannot see that they put together a Scenario. */
function scenarioBlock(reading: Reading): Block {
  const term = termBlock(reading);
  return reading.object("A scenario", {
    format: reading.word("Format", ["restband-scenario/1"]),
    title: reading.text("Title").default(""),
    purpose: reading.word("Purpose", purposes).default("other"),
    motion: reading.word("Motion", ["linear", "angular"]),
    body: reading.object("Body", membersOf(reading, { fields: fields.bodyFields })),
    solid: solidBlock(reading).default({ model: "none" }),
    contact: contactBlock(reading),
    incline: memberOf(reading, fields.inclineField),
    force: reading.list("Force", term).default([]),
    base: reading.list("Base", term).default([]),
    initial: reading
      .object("Start", membersOf(reading, { fields: fields.initialFields }))
      .default({ displacement: 0, velocity: 0 }),
    span: reading.object("Span", {
      ...membersOf(reading, { fields: fields.spanFields }),
      untilRest: reading.flag("Until rest").default(true),
    }),
    settleBand: reading.number(fields.settleBandField).nullable().default(null),
    limits: reading.list("Limits", limitBlock(reading)).default([]),
    origins: reading.entries("Origins", originBlock(reading)).default({}),
  });
}

function contactBlock(reading: Reading): Block {
  return reading.object("Contact", {
    law: lawBlock(reading),
    normal: reading.object("Normal force", {
      ...membersOf(reading, { fields: fields.normalFields }),
      weight: reading.flag("Weight").default(false),
      ripple: reading
        .object("Ripple", membersOf(reading, { fields: fields.rippleFields }))
        .nullable()
        .default(null),
    }),
    radius: memberOf(reading, fields.radiusField),
    counterface: choiceOf(reading, fields.counterfaceChoice).default("ground"),
  });
}

function anyNumber(key: string, label: string): Field {
  return { key, label, dimension: "none", initial: 0 };
}

function limitBlock(reading: Reading): Block {
  return reading.object("Limit", {
    quantity: reading.word("Quantity", quantityNames),
    min: reading.number(anyNumber("min", "Least value")).optional(),
    max: reading.number(anyNumber("max", "Largest value")).optional(),
  });
}

function originBlock(reading: Reading): Block {
  return reading.object("Origin", {
    kind: reading.word("Kind of origin", originKinds),
    source: reading.text("Source").optional(),
    entered: reading.text("Entered value").optional(),
    low: reading.number(anyNumber("low", "Low end")).optional(),
    high: reading.number(anyNumber("high", "High end")).optional(),
    distribution: reading.text("Distribution").optional(),
    measurement: reading.text("Measurement").optional(),
  });
}
