import { createHash } from "node:crypto";
import { canonicalText, checkScenario, digestOf, jsonText, recordDigest, type Scenario } from "@restband/solver";
import { describe, expect, it } from "vitest";
import { plainScenario } from "./plain-scenario.ts";

const checked = (input: unknown) => checkScenario(input).scenario as Scenario;
const sha256 = (data: string | Uint8Array) => createHash("sha256").update(data).digest("hex");

/** Numbers of RFC 8785, appendix B, by their bits (recalled; each holds or fails by itself). */
const numbers: [bits: string, text: string][] = [
  ["0000000000000000", "0"],
  ["8000000000000000", "0"],
  ["0000000000000001", "5e-324"],
  ["8000000000000001", "-5e-324"],
  ["7fefffffffffffff", "1.7976931348623157e+308"],
  ["ffefffffffffffff", "-1.7976931348623157e+308"],
  ["4340000000000000", "9007199254740992"],
  ["c340000000000000", "-9007199254740992"],
  ["4430000000000000", "295147905179352830000"],
  ["44b52d02c7e14af5", "9.999999999999997e+22"],
  ["44b52d02c7e14af6", "1e+23"],
  ["44b52d02c7e14af7", "1.0000000000000001e+23"],
  ["444b1ae4d6e2ef4e", "999999999999999700000"],
  ["444b1ae4d6e2ef4f", "999999999999999900000"],
  ["444b1ae4d6e2ef50", "1e+21"],
  ["3eb0c6f7a0b5ed8c", "9.999999999999997e-7"],
  ["3eb0c6f7a0b5ed8d", "0.000001"],
  ["41b3de4355555553", "333333333.3333332"],
  ["41b3de4355555554", "333333333.33333325"],
  ["41b3de4355555555", "333333333.3333333"],
  ["41b3de4355555556", "333333333.3333334"],
  ["41b3de4355555557", "333333333.33333343"],
  ["becbf647612f3696", "-0.0000033333333333333333"],
  ["43143ff3c1cb0959", "1424953923781206.2"],
];

describe("canonical JSON", () => {
  it.each(numbers)("prints the double %s as %s", (bits, text) => {
    const view = new DataView(new ArrayBuffer(8));
    view.setBigUint64(0, BigInt(`0x${bits}`));
    expect(jsonText(view.getFloat64(0), "sorted")).toBe(text);
  });

  it("refuses numbers that JSON cannot hold, naming their place", () => {
    expect(() => jsonText({ a: [1, NaN] })).toThrow(/a\[1\] is not finite/);
    expect(() => jsonText({ samples: { t: new Float64Array([0, Infinity]) } })).toThrow(
      /samples\.t\[1\] is not finite/,
    );
  });

  it("sorts keys by UTF-16 units, as the example of RFC 8785 does", () => {
    const keys = ["\u20ac", "\r", "\ufb33", "1", "\ud83d\ude00", "\u0080", "\u00f6"];
    const text = jsonText(Object.fromEntries(keys.map((key) => [key, 0])), "sorted");
    const order = Object.keys(JSON.parse(text) as object);
    expect(order).toEqual(["1", "\r", "\u0080", "\u00f6", "\u20ac", "\ud83d\ude00", "\ufb33"]);
    expect(text.startsWith('{"\\r":0,"1":0')).toBe(true);
  });

  it("writes nested data without spaces, typed arrays as lists", () => {
    const data = { b: new Float64Array([1, -0]), a: [true, null, "é\n"], left: undefined };
    expect(jsonText(data, "sorted")).toBe('{"a":[true,null,"é\\n"],"b":[1,0]}');
    expect(jsonText(data)).toBe('{"b":[1,0],"a":[true,null,"é\\n"]}');
  });
});

describe("the canonical text of a scenario", () => {
  const scenario = checked(plainScenario({ incline: -0, title: "Klemme ä", force: [{ kind: "ramp", rate: 1e-7 }] }));

  it("has every default, keys in order, −0 as 0", () => {
    expect(canonicalText(scenario)).toBe(
      '{"base":[],"body":{"cubic":0,"inertia":2,"stiffness":800,"viscous":0},"contact":{"counterface":"ground","law":' +
        '{"kinetic":0.1,"model":"coulomb","static":0.2},"normal":{"faces":1,"preload":40,"ripple":null,"weight":false},' +
        '"radius":1},"force":[{"kind":"ramp","rate":1e-7,"start":0,"stop":"none"}],"format":"restband-scenario/1",' +
        '"incline":0,"initial":{"displacement":0,"velocity":0},"limits":[],"motion":"linear","origins":{},' +
        '"purpose":"other","settleBand":null,"solid":{"model":"none"},"span":{"maxEvents":200000,"maxWork":20000000,' +
        '"seconds":1,"untilRest":true},"title":"Klemme ä"}',
    );
  });

  it("is hashed as UTF-8", () => expect(digestOf(scenario)).toBe(sha256(canonicalText(scenario))));

  it("changes with title, purpose and origins", () => {
    const digests = [
      plainScenario(),
      plainScenario({ title: "x" }),
      plainScenario({ purpose: "feed" }),
      plainScenario({ origins: { "body.inertia": { kind: "assumed" } } }),
    ].map((input) => digestOf(checked(input)));
    expect(new Set(digests).size).toBe(4);
  });
});

describe("a long record", () => {
  const times = Array.from({ length: 1001 }, (_, i) => i / 100);
  const values = times.map((t) => Math.sin(t));

  it("is named by the SHA-256 of its doubles", () => {
    const bytes = new Uint8Array(Float64Array.from([...times, ...values]).buffer);
    expect(recordDigest(times, values)).toBe(sha256(bytes));
    expect(recordDigest([0, 1], [-0, 2])).toBe(recordDigest([0, 1], [0, 2]));
  });

  it("hashes alike inline and stored, and stays inline in the scenario", () => {
    const inline = checked(plainScenario({ force: [{ kind: "record", times, values }] }));
    const digest = recordDigest(times, values);
    const stored = checked(plainScenario({ force: [{ kind: "record", digest, points: 1001 }] }));
    expect(inline.force[0]).toHaveProperty("times");
    expect(canonicalText(inline)).toContain(`{"digest":"${digest}","kind":"record","points":1001}`);
    expect(digestOf(inline)).toBe(digestOf(stored));
  });

  it("keeps the origin of its values when it is stored", () => {
    const origins = { "force[0].values": { kind: "measured" } };
    const inline = checked(plainScenario({ force: [{ kind: "record", times, values }], origins }));
    expect(checkScenario(JSON.parse(canonicalText(inline))).faults).toEqual([]);
  });

  it("of 1,000 points is written out", () => {
    const force = [{ kind: "record", times: times.slice(1), values: values.slice(1) }];
    expect(canonicalText(checked(plainScenario({ force })))).toContain('"times":[0.01,');
  });
});
