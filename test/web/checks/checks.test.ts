import { describe, expect, it } from "vitest";
import { allowedShare, balanceOf, largestEntry, ledgerRows } from "../../../web/src/features/checks/ledger.ts";
import { methodWords, noteWords } from "../../../web/src/features/checks/method-words.ts";
import { creepFeed, solved, variant } from "../support/scenarios.ts";

const { result } = solved(creepFeed);
const energy =
  result.energy ??
  (() => {
    throw new Error("no energy");
  })();

describe("the energy ledger", () => {
  it("names what was put in, what became heat and what is left, and leaves out what is nothing", () => {
    expect(ledgerRows(energy).map(({ name }) => name)).toEqual([
      "Put in by the drive",
      "Heat in the contact",
      "Heat in the damper",
      "Left in the spring",
    ]);
    const sum = ledgerRows(energy).reduce((total, { value }) => total + value, 0);
    expect(Math.abs(sum)).toBeLessThan(1e-9 * largestEntry(energy));
  });

  it("turns its words round with the sign", () => {
    const released = { ...energy, workBase: -1, changeStored: -2, changeKinetic: 0.5 };
    expect(ledgerRows(released).map(({ name }) => name)).toContain("Given up by the spring");
    expect(ledgerRows(released)[0]).toEqual({ name: "Taken out by the drive", value: -1 });
    expect(ledgerRows(released).at(-1)).toEqual({ name: "Left in motion", value: -0.5 });
  });

  it("balances to the share its method allows, and says so where it does not", () => {
    expect(balanceOf(energy, "exact").isBalanced).toBe(true);
    const off = { ...energy, residual: 2e-9 * largestEntry(energy) };
    expect(balanceOf(off, "exact").isBalanced).toBe(false);
    expect(balanceOf(off, "adaptive").isBalanced).toBe(true);
    expect([allowedShare("exact"), allowedShare("adaptive")]).toEqual([1e-9, 1e-6]);
  });
});

describe("the method in words", () => {
  it("tells method, end and number of events", () => {
    const [method, end] = methodWords(creepFeed, result);
    expect(method).toMatch(/^Exact method: .* no time step and no tolerance/);
    expect(end.replaceAll("\u00a0", " ")).toBe(
      `The run ends at 0.5 s, the time asked for. It has ${result.events.length - 2} events.`,
    );
  });

  it("tells why a run was cut off", () => {
    const cut = solved(variant({ span: { ...creepFeed.span, maxEvents: 4 } }));
    expect(methodWords(cut.scenario, cut.result)[1]).toContain("after the 4 events it is allowed. It has four events.");
  });

  it("adds the time to a note that does not say it", () => {
    expect(noteWords({ code: "contact-lost", message: "The faces part", t: 0.25 }).replaceAll("\u00a0", " ")).toBe(
      "The faces part. (at 0.25 s)",
    );
    expect(noteWords({ code: "next-break-away", message: "It breaks away at 50 s.", t: 50 })).toBe(
      "It breaks away at 50 s.",
    );
  });
});
