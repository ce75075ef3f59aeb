import { useId, type ReactNode } from "react";
import { classNames } from "./class-names.ts";

interface WorkedPageProps {
  children: ReactNode;
  className?: string;
}

/** The column of a worked page: holds `Section`s and the hairline rule that runs down between margin and main. */
export function WorkedPage({ children, className }: WorkedPageProps) {
  return (
    <main
      id="content"
      tabIndex={-1}
      className={classNames(
        "page-width relative grow pb-12",
        "desk:before:absolute desk:before:inset-y-0 desk:before:left-[calc(var(--page-pad)+var(--margin-col)+16px)] desk:before:w-px desk:before:bg-line",
        className,
      )}
    >
      {children}
    </main>
  );
}

interface SectionProps {
  /** Stands in the margin; a heading on the phone. */
  name: string;
  /** One quiet line under the name. */
  help?: ReactNode;
  /** For links to it: `#evidence`. */
  id?: string;
  children: ReactNode;
  className?: string;
}

/** One part of a worked page: its name in the margin, its matter in the main column, a hairline above all but the first. */
export function Section({ name, help, id, children, className }: SectionProps) {
  const headingId = useId();
  return (
    <section
      id={id}
      aria-labelledby={headingId}
      className={classNames(
        "border-line pt-6 pb-8 not-first:border-t desk:grid desk:grid-cols-[var(--margin-col)_minmax(0,1fr)] desk:gap-(--gap) desk:pt-9 desk:pb-10",
        className,
      )}
    >
      <div className="mb-4 desk:mb-0">
        <h2 id={headingId} className="text-15 font-bold">
          {name}
        </h2>
        {help && <p className="mt-1.5 text-13 text-quiet max-desk:hidden">{help}</p>}
      </div>
      <div className="min-w-0">{children}</div>
    </section>
  );
}
