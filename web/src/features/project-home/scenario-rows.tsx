import type { StoredScenario } from "@restband/api/contract";
import { useEffect, useRef, useState, type ReactNode } from "react";

interface ScenarioRowsProps {
  scenarios: readonly StoredScenario[];
  /** A row; `isSeen` turns true once it comes near the visible part of the page, and only then is it computed. */
  row: (stored: StoredScenario, isSeen: boolean) => ReactNode;
}

/** The scenarios of a project, in the order last touched. */
export function ScenarioRows({ scenarios, row }: ScenarioRowsProps) {
  return (
    <section aria-labelledby="scenarios">
      <div className="flex flex-wrap items-baseline gap-x-4 border-b border-edge pb-2 text-13">
        <h2 id="scenarios" className="font-bold">
          Scenarios
        </h2>
        <p className="text-quiet">in the order last touched</p>
      </div>
      <ul>
        {scenarios.map((stored) => (
          <SeenItem key={stored.id}>{(isSeen) => row(stored, isSeen)}</SeenItem>
        ))}
      </ul>
    </section>
  );
}

function SeenItem({ children }: { children: (isSeen: boolean) => ReactNode }) {
  const item = useRef<HTMLLIElement>(null);
  const [isSeen, setSeen] = useState(false);
  useEffect(() => {
    if (isSeen || !item.current) return;
    const see = (entries: IntersectionObserverEntry[]) => entries.some((each) => each.isIntersecting) && setSeen(true);
    const observer = new IntersectionObserver(see, { rootMargin: "1500px" });
    observer.observe(item.current);
    return () => observer.disconnect();
  }, [isSeen]);
  return (
    <li ref={item} className="border-b border-line">
      {children(isSeen)}
    </li>
  );
}
