import type { ReactNode } from "react";
import { classNames } from "./class-names.ts";
import { Icon } from "./icon.tsx";

interface ErrorNoteProps {
  children: ReactNode;
  /** What a person can do about it. */
  action?: ReactNode;
  className?: string;
}

/** Something went wrong that belongs to no single field; read out as it appears. */
export function ErrorNote({ children, action, className }: ErrorNoteProps) {
  return (
    <div
      role="alert"
      className={classNames("flex gap-2.5 rounded border-2 border-broken bg-raised px-3.5 py-2.5", className)}
    >
      <span className="mt-[3px] text-broken">
        <Icon name="cross" weight={2.4} />
      </span>
      <div className="min-w-0 max-w-(--measure)">
        {children}
        {action && <div className="mt-2">{action}</div>}
      </div>
    </div>
  );
}
