import { sayShare } from "../../../format/format-quantity.ts";
import type { Measure } from "../../../format/unit.ts";
import { Outcome } from "../outcome.tsx";
import type { ReckoningBodyProps } from "../reckoning-body.ts";
import { chainSentence } from "./chain-words.ts";
import { compilePart } from "./compile-chain.ts";
import { GroupCard } from "./group-card.tsx";
import { kits } from "./kit.ts";
import { largest, sharesOf, valueOf } from "./network.ts";
import { emptyGroup } from "./part.ts";
import { asShown } from "../taken.ts";
import { SharesTable } from "./shares-table.tsx";
import { useKeptState } from "./use-kept-state.ts";

/** A chain of members between body and base, or the sum of all that moves: its members, the whole, and each one's part in it. */
export function ChainBody({ reckoning, path, scenario, keptUnder, onTake, onClose }: ReckoningBodyProps) {
  const kit = kits[reckoning.key as keyof typeof kits];
  const { motion } = scenario;
  const [root, setRoot] = useKeptState(`${keptUnder} ${reckoning.key} ${motion}`, () =>
    emptyGroup(1, kit.canStandInSeries ? "series" : "parallel"),
  );
  const compiled = compilePart(root, motion, kit);
  const network = "network" in compiled ? compiled.network : null;
  const shares = network ? sharesOf(network) : [];
  const measure: Measure = { dimension: kit.dimension, motion };
  const take = (): void => {
    if (!network) return;
    const source = chainSentence(root, shares, motion, kit);
    onTake([{ path, value: asShown(valueOf(network)), origin: { kind: "calculated", source } }]);
  };
  const missing = root.parts.length === 0 ? kit.empty : "missing" in compiled ? compiled.missing : undefined;
  const most = shares.length > 1 ? largest(shares) : null;
  return (
    <div className="flex flex-col gap-5">
      <GroupCard group={root} root={root} motion={motion} kit={kit} onRoot={setRoot} />
      {most && (
        <div>
          <p className="mb-2 font-semibold">{kit.most(most.name, sayShare(most.share))}</p>
          <SharesTable shares={shares} kit={kit} measure={measure} />
        </div>
      )}
      <Outcome
        symbol={kit.symbol(motion)}
        measure={measure}
        value={network && valueOf(network)}
        range={null}
        missing={missing}
        onTake={take}
        onClose={onClose}
      />
    </div>
  );
}
