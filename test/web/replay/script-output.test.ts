import { replayDraftSchema } from "@restband/api/contract";
import { describe, expect, it } from "vitest";
import { readScriptOutput } from "../../../web/src/features/replay/script-output.ts";

const printed = `quantity                                 claimed                found here  unit         apart      share
naturalHz                       3.18309886183791          3.18309886183791  Hz        0.00e+00    0.0e+00
halfCycles                                     5                         5            0.00e+00    0.0e+00
peakAcceleration                            29.6             29.6000000001  m/s2      1.00e-10    3.4e-12
driveForcePeak                              65.2                      65.2  N m       0.00e+00    0.0e+00
restOffset                  -0.00650000000000003      -0.00649999999995177  m         4.83e-14    5.9e-13

events: 8 claimed, 8 found here
time of events                  0.62831853071796          0.62831853071676  s         1.20e-12    1.5e-12  at event 6, stop

agrees: largest difference 3.4e-12 of the run's peak, 1e-06 allowed
`;

describe("what the Python file printed", () => {
  it("is read figure by figure, the largest first", () => {
    const draft = readScriptOutput(printed, "0.2.0");
    expect(draft).toMatchObject({ way: "script", verdict: "agrees", differences: [] });
    expect(draft?.deviations).toHaveLength(6);
    expect(draft?.deviations[0]).toEqual({
      what: "peakAcceleration",
      values: [29.6, 29.6000000001],
      absolute: 1e-10,
      relative: 3.4e-12,
    });
    expect(draft?.deviations[1]).toMatchObject({ what: "t", event: 6, relative: 1.5e-12 });
    expect(replayDraftSchema.safeParse(draft).success).toBe(true);
  });

  it("is judged by its figures, whatever its last line says", () => {
    const wrong = printed.replace("1.00e-10    3.4e-12", "1.00e-03    3.4e-05  <-- more than allowed");
    expect(readScriptOutput(wrong, "0.2.0")?.verdict).toBe("differs");
  });

  it("tells events that are not the same, and values on one side only", () => {
    const wrong = printed
      .replace("8 found", "9 found")
      .replace("m         4.83e-14    5.9e-13", "m        has a value on one side only");
    expect(readScriptOutput(wrong, "0.2.0")?.differences).toEqual([
      "restOffset has a value on one side only.",
      "There are 8 events in the revision and 9 in the file's run.",
    ]);
  });

  it("is refused where it is cut off or something else", () => {
    expect(readScriptOutput(printed.slice(0, 600), "0.2.0")).toBeNull();
    expect(readScriptOutput("agrees: largest difference 0", "0.2.0")).toBeNull();
    expect(readScriptOutput("", "0.2.0")).toBeNull();
  });
});
