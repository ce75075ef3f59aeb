import { useId, type ReactNode } from "react";

/** Up to three columns of fields side by side, one below the other where there is no room. */
export function FormColumns({ children }: { children: ReactNode }) {
  return <div className="grid gap-x-8 gap-y-6 desk:grid-cols-2 wide:grid-cols-3">{children}</div>;
}

/** One column: its quiet heading over a rule, its fields below. */
export function FormColumn({ title, children }: { title: string; children: ReactNode }) {
  const id = useId();
  return (
    <div role="group" aria-labelledby={id} className="flex min-w-0 flex-col gap-4">
      <p id={id} className="border-b border-edge pb-2 text-13 text-quiet">
        {title}
      </p>
      {children}
    </div>
  );
}
