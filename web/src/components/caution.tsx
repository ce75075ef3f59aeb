import type { ReactNode } from "react";
import { classNames } from "./class-names.ts";

/** A warning that stays: people can get hurt, or the answer means less than it seems. */
export function Caution({ title, children, className }: { title?: string; children: ReactNode; className?: string }) {
  return (
    <div
      role="note"
      className={classNames("max-w-[760px] rounded border-[1.5px] border-ink px-5 py-4 [&>p+p]:mt-2.5", className)}
    >
      {title && <p className="font-bold">{title}</p>}
      {children}
    </div>
  );
}
