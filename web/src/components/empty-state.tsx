import type { ReactNode } from "react";

/** Nothing here yet: one sentence and one button. */
export function EmptyState({ children, action }: { children: ReactNode; action?: ReactNode }) {
  return (
    <div className="flex flex-col items-start gap-4 py-6">
      <p className="max-w-(--measure) text-18 text-quiet">{children}</p>
      {action}
    </div>
  );
}
