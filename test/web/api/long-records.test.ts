import type { StoredScenario } from "@restband/api/contract";
import { canonicalForm, checkScenario } from "@restband/solver";
import { describe, expect, it } from "vitest";
import { ApiFailure } from "../../../web/src/api/api-failure.ts";
import { sendNamed, withPointsOf } from "../../../web/src/api/long-records.ts";
import type { Work } from "../../../web/src/api/work.ts";
import { longRecord, recordScenario } from "../../support/long-record.ts";

const content = checkScenario(recordScenario()).scenario!;
const short = checkScenario(recordScenario(longRecord(3, 100))).scenario!;
const off = { place: "force" as const, index: 1, term: content.force[0], origins: {}, units: {} };
const work: Work = { content, switchedOff: [off] };
const name = canonicalForm(content).force[0];

const unknown = new ApiFailure(422, { code: "unknown-record", message: "Send them along." });

/** A server that keeps what was sent; it has the points of no record at first. */
function sending(failures: ApiFailure[] = []) {
  const sent: (readonly Work[])[] = [];
  const send = (works: readonly Work[]) => {
    sent.push(works);
    const failure = failures.shift();
    return failure ? Promise.reject(failure) : Promise.resolve(works);
  };
  return { sent, send };
}

describe("what is sent of long records", () => {
  it("is their digests, where the server has their points", async () => {
    const { sent, send } = sending();
    await sendNamed([work], send);
    expect(sent).toHaveLength(1);
    expect(sent[0][0].content.force).toEqual([name]);
    expect(sent[0][0].switchedOff[0].term).toEqual(name);
  });

  it("is their points, where it has not", async () => {
    const { sent, send } = sending([unknown]);
    expect(await sendNamed([work], send)).toEqual([work]);
    expect(sent).toHaveLength(2);
  });

  it("is not sent again for another failure, and a short record is sent as it is", async () => {
    const { sent, send } = sending([new ApiFailure(409, { code: "stale-version", message: "" })]);
    await expect(sendNamed([work], send)).rejects.toMatchObject({ code: "stale-version" });
    expect(sent).toHaveLength(1);
    expect(await sendNamed([{ content: short, switchedOff: [] }], send)).toEqual([{ content: short, switchedOff: [] }]);
  });
});

it("gives an answer the points that were sent by their digests", () => {
  const kept = { content: canonicalForm(content), switchedOff: [{ ...off, term: name }] } as StoredScenario;
  expect(withPointsOf(work, kept)).toEqual(work);
});
