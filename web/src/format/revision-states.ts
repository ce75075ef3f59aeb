import type { RevisionState } from "@restband/api/contract";

/** How a revision stands, in words; `tone` as limits have it: good, bad, or neither. */
export const revisionStates: Record<RevisionState, { word: string; tone: "kept" | "broken" | "quiet"; says: string }> =
  {
    open: { word: "not reviewed", tone: "quiet", says: "Nobody has been asked to review it yet." },
    "in-review": { word: "in review", tone: "quiet", says: "Somebody has been asked, and has not decided." },
    accepted: { word: "accepted", tone: "kept", says: "A reviewer has accepted it. It stays as it is." },
    returned: { word: "returned", tone: "broken", says: "A reviewer has returned it with reasons." },
    "self-checked": {
      word: "self-checked",
      tone: "quiet",
      says: "Its own author has checked it. That is not a review by somebody else.",
    },
    superseded: { word: "superseded", tone: "quiet", says: "It was accepted, and a later revision is accepted now." },
    withdrawn: { word: "withdrawn", tone: "broken", says: "It was accepted, and an owner has withdrawn that." },
  };
