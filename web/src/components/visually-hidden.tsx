import type { ReactNode } from "react";

/** Words for those who hear the page. */
export function VisuallyHidden({ children }: { children: ReactNode }) {
  return <span className="sr-only">{children}</span>;
}
