import type { ActivityEntry } from "@restband/api/contract";
import { expect, it } from "vitest";
import { tellTrail } from "../../../web/src/features/project-home/lately-words.ts";

let count = 0;
const act = (name: string, change: Partial<ActivityEntry> = {}): ActivityEntry => ({
  id: ++count,
  at: "2026-11-20T08:00:00.000Z",
  by: { accountId: "tomas", name: "Tomas Wik" },
  act: name,
  subject: { id: "s", name: "Slide", isThere: true },
  detail: {},
  ...change,
});

const told = (...entries: ActivityEntry[]): string[] =>
  tellTrail(entries, "ines").map(
    ({ before, revision, scenario, after }) =>
      before + (revision ? `revision ${revision.number} of ` : "") + (scenario?.title ?? "") + after,
  );

const ofRevision = { revisionId: "r", number: 2 };

it.each([
  [act("scenario.created"), "Tomas Wik began Slide."],
  [act("scenario.saved", { detail: { changed: "contact" } }), "Tomas Wik changed the contact of Slide."],
  [
    act("scenario.saved", { detail: { changed: "base limits" } }),
    "Tomas Wik changed the drive and the limits of Slide.",
  ],
  [act("scenario.saved", { detail: { changed: "title" } }), "Tomas Wik renamed Slide."],
  [act("scenario.saved", { detail: { changed: "body base span limits" } }), "Tomas Wik changed Slide."],
  [act("scenario.saved"), "Tomas Wik saved Slide."],
  [act("scenario.moved-out"), "Tomas Wik moved Slide to another project."],
  [act("cases.created", { subject: null, detail: { count: 40 } }), "Tomas Wik made 40 scenarios of a table of cases."],
  [act("revision.frozen", { detail: ofRevision }), "Tomas Wik froze revision 2 of Slide."],
  [
    act("revision.replayed", { detail: { ...ofRevision, verdict: "agrees" } }),
    "Tomas Wik replayed revision 2 of Slide: it agrees.",
  ],
  [
    act("review.asked", { detail: { ...ofRevision, reviewer: "Priya Raman" } }),
    "Tomas Wik asked Priya Raman to review revision 2 of Slide.",
  ],
  [act("comment.settled", { detail: ofRevision }), "Tomas Wik settled a comment on revision 2 of Slide."],
  [act("checklist.set", { subject: null, detail: { count: 3 } }), "Tomas Wik set the checklist: three points."],
  [act("project.archived", { subject: null, by: { accountId: "ines", name: "Ines" } }), "You archived the project."],
  [
    act("member.changed", { subject: { id: "ines", name: "Ines", isThere: true }, detail: { role: "editor" } }),
    "Tomas Wik made you editor.",
  ],
  [
    act("member.removed", { subject: { id: "tomas", name: "Tomas Wik", isThere: true } }),
    "Tomas Wik left the project.",
  ],
  [act("thing.unheard-of"), "Tomas Wik thing.unheard-of."],
])("%o", (entry, sentence) => {
  expect(told(entry)).toEqual([sentence]);
});

it("tells saves in a row of one scenario by one person on one day once, with all they changed", () => {
  const saves = ["contact", "body", "contact"].map((changed) => act("scenario.saved", { detail: { changed } }));
  expect(told(...saves)).toEqual(["Tomas Wik changed the contact and the body of Slide."]);
  const another = act("scenario.saved", { by: { accountId: "ines", name: "Ines" }, detail: { changed: "body" } });
  const before = act("scenario.saved", { at: "2026-11-18T08:00:00.000Z", detail: { changed: "body" } });
  expect(told(saves[0], another, saves[1], before)).toHaveLength(4);
});
