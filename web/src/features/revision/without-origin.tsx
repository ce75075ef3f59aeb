import { capitalised, sayMany } from "../../format/words.ts";

/** The values of which nobody had said, when it was frozen, where they come from. */
export function WithoutOrigin({ labels }: { labels: readonly string[] }) {
  if (labels.length === 0)
    return <p className="border-t border-line pt-3 text-13 text-quiet">Every value says where it comes from.</p>;
  return (
    <p className="border-t border-line pt-3 text-13 text-quiet">
      <span className="font-semibold text-ink">{capitalised(sayMany(labels.length, "value"))} without an origin:</span>{" "}
      {labels.join(", ")}
    </p>
  );
}
