import { randomInt } from "node:crypto";
import { join } from "node:path";
import { keep, local } from "./project.mjs";

const words =
  "amber anvil barge basil birch brass cedar chalk clamp cloud coral crane delta ember fable ferry flint gauge glade grain harbor hazel heron ivory kettle lantern larch lever linen maple marble meadow mortar nickel north ochre olive otter pebble pewter pillar plum quartz quill raven ridge river saddle sable slate spindle spruce summit tally thistle timber topaz umber valley walnut willow winch".split(
    " ",
  );

/** The password of the demo's people in this folder: four random words, made once and kept for its owner to read. */
export function demoPassword() {
  return process.env.RESTBAND_DEMO_PASSWORD ?? keep(join(local, "demo-password"), makePassword);
}

function makePassword() {
  return Array.from({ length: 4 }, () => words[randomInt(words.length)]).join("-");
}
