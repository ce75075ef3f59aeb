import { useEffect, useRef, useState, type ReactNode } from "react";
import { buttonClass, type ButtonKind } from "./button.tsx";
import { classNames } from "./class-names.ts";

interface MenuProps {
  /** What the button says. */
  label: ReactNode;
  /** What it is called where the label is a drawing. */
  name?: string;
  kind?: ButtonKind;
  buttonClassName?: string;
  /** Links and buttons; a click on one of them closes the menu. */
  children: ReactNode;
}

/** A button that opens a small sheet of links and buttons below it. Escape, a click beside it and leaving it by Tab close it. */
export function Menu({ label, name, kind, buttonClassName, children }: MenuProps) {
  const [isOpen, setOpen] = useState(false);
  const root = useRef<HTMLDivElement>(null);
  const button = useRef<HTMLButtonElement>(null);
  useEffect(() => {
    if (!isOpen) return;
    const closeBeside = (event: PointerEvent) => root.current?.contains(event.target as Node) || setOpen(false);
    document.addEventListener("pointerdown", closeBeside);
    return () => document.removeEventListener("pointerdown", closeBeside);
  }, [isOpen]);
  const closeByEscape = (event: React.KeyboardEvent) => {
    if (event.key !== "Escape" || !isOpen) return;
    event.stopPropagation();
    setOpen(false);
    button.current?.focus();
  };
  return (
    <div
      ref={root}
      className="relative"
      onKeyDown={closeByEscape}
      onBlur={(event) => event.relatedTarget && !root.current?.contains(event.relatedTarget) && setOpen(false)}
    >
      <button
        ref={button}
        type="button"
        aria-label={name}
        title={name}
        aria-expanded={isOpen}
        className={buttonClass(kind, buttonClassName)}
        onClick={() => setOpen(!isOpen)}
      >
        {label}
      </button>
      {isOpen && (
        <div
          className="absolute top-full right-0 z-30 mt-2 flex w-max max-w-[calc(100vw-32px)] min-w-52 flex-col gap-1 rounded border-[1.5px] border-ink bg-paper p-2"
          onClick={(event) => (event.target as HTMLElement).closest("a,button") && setOpen(false)}
        >
          {children}
        </div>
      )}
    </div>
  );
}

/** The look of a link or button inside a menu. */
export const menuItemClass = classNames(
  "hit flex w-full items-center gap-2 rounded px-2.5 py-1 text-left text-15 hover:bg-tint",
);
