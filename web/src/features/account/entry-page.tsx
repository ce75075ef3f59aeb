import type { ReactNode } from "react";
import { Link } from "react-router-dom";
import { Mark } from "../../components/mark.tsx";
import { useShortcutsDialog } from "../../components/shortcuts.tsx";
import { chooseTheme, useTheme } from "../../components/theme.ts";
import { paths } from "../../paths.ts";
import { RestCurve } from "./rest-curve.tsx";

/** The page before one is in: what the product answers at the left, a form at the right, the drawn motion below. */
export function EntryPage({ title, children }: { title: string; children: ReactNode }) {
  return (
    <>
      <main id="content" tabIndex={-1} className="flex grow flex-col justify-between">
        <div className="page-width grid gap-x-16 gap-y-8 pt-6 pb-8 desk:grid-cols-[minmax(0,1fr)_minmax(300px,372px)] desk:pt-14">
          <div className="flex items-center gap-2.5 self-start text-24 font-bold desk:text-24">
            <Mark size={36} />
            Restband
          </div>
          <section className="desk:row-span-2" aria-label={title}>
            <h1 className="mb-6 text-24 font-semibold">{title}</h1>
            {children}
          </section>
          <div className="self-start">
            <p className="max-w-[22em] text-24 font-semibold desk:max-w-[16em] desk:text-34">
              Will it stop where it should, creep smoothly, or stick and slip?
            </p>
            <p className="mt-4 max-w-[31em] text-18 text-quiet">
              Answers for bodies held by a spring and rubbed by dry friction, with every number traced to its source.
            </p>
          </div>
        </div>
        <RestCurve />
      </main>
      <EntryFooter />
    </>
  );
}

function EntryFooter() {
  const other = useTheme() === "dark" ? "light" : "dark";
  const shortcuts = useShortcutsDialog();
  return (
    <footer className="border-t border-line">
      <div className="page-width flex flex-wrap justify-between gap-x-8 gap-y-2 py-5 text-13 text-quiet">
        <p>Results are those of an idealised body. They do not replace a judgement on safety.</p>
        <div className="flex gap-6">
          <Link to={paths.licences} className="link">
            Licences
          </Link>
          <button type="button" className="link" onClick={shortcuts.open}>
            Keyboard
          </button>
          <button type="button" className="link" onClick={() => chooseTheme(other)}>
            {other === "dark" ? "Dark" : "Light"}
          </button>
        </div>
      </div>
      {shortcuts.dialog}
    </footer>
  );
}
