import { type ComponentType } from "react";
import { Dialog } from "../../components/dialog.tsx";
import { lazyPart } from "../../components/lazy-part.ts";
import type { ReckoningBodyProps } from "./reckoning-body.ts";
import type { ReckoningKey } from "./reckonings.ts";

const ChainBody = lazyPart(async () => (await import("./chain/chain-body.tsx")).ChainBody);
const SheetBody = lazyPart(async () => (await import("./sheets/sheet-body.tsx")).SheetBody);
const TableBody = lazyPart(async () => (await import("./tables/table-body.tsx")).TableBody);

/** What each reckoning looks like inside; loaded when it is opened. */
const bodies: Readonly<Record<ReckoningKey, ComponentType<ReckoningBodyProps>>> = {
  "friction-pairs": TableBody,
  "loss-factors": TableBody,
  "loss-from-decay": SheetBody,
  "stiffness-chain": ChainBody,
  "inertia-sum": ChainBody,
  damping: SheetBody,
  bolts: SheetBody,
  "band-brake": SheetBody,
};

/** A reckoning in a dialog; what comes out is taken into the scenario by its button, with where it comes from. */
export function ReckoningDialog({ isOpen, ...props }: ReckoningBodyProps & { isOpen: boolean }) {
  const Body = bodies[props.reckoning.key];
  return (
    // Keys pressed in here are not for the value editor the dialog was opened from.
    <div onKeyDown={(event) => event.stopPropagation()}>
      <Dialog isOpen={isOpen} title={props.reckoning.title} onClose={props.onClose} isWide>
        <Body {...props} />
      </Dialog>
    </div>
  );
}
