import type { ComponentProps, MouseEvent } from "react";
import { Link, type LinkProps } from "react-router-dom";
import { classNames } from "./class-names.ts";

/** `primary`: what the page is for, once a page. `plain`: other acts. `danger`: takes something away. `quiet`: a square without a frame, for icons. */
export type ButtonKind = "primary" | "plain" | "danger" | "quiet";

const looks: Record<ButtonKind, string> = {
  primary: "border-slip bg-slip text-on-slip forced-color-adjust-none hover:brightness-110 active:brightness-95",
  plain: "border-edge bg-raised text-ink hover:border-ink",
  danger: "border-broken bg-raised text-broken hover:bg-broken hover:text-paper",
  quiet:
    "min-w-(--hit) justify-center border-transparent px-0! text-ink hover:border-edge pointer-coarse:min-w-(--hit-touch)",
};

/** The look of a button, for the rare element that cannot be one of the two below. */
export function buttonClass(kind: ButtonKind = "plain", className?: string): string {
  return classNames(
    "hit inline-flex items-center justify-center gap-2 rounded border px-3.5 py-1 text-15 font-bold whitespace-nowrap",
    "aria-disabled:cursor-default aria-disabled:opacity-60 disabled:opacity-60",
    looks[kind],
    className,
  );
}

interface ButtonProps extends ComponentProps<"button"> {
  "data-first-focus"?: boolean;
  kind?: ButtonKind;
  /** While true the button keeps the focus but does nothing, and says so. */
  isBusy?: boolean;
}

export function Button({ kind, isBusy = false, type = "button", className, onClick, ...rest }: ButtonProps) {
  const press = (event: MouseEvent<HTMLButtonElement>) => (isBusy ? event.preventDefault() : onClick?.(event));
  return (
    <button
      {...rest}
      type={type}
      className={buttonClass(kind, className)}
      aria-disabled={isBusy || undefined}
      onClick={press}
    />
  );
}

/** A way to another page that looks like a button. */
export function ButtonLink({ kind, className, ...rest }: LinkProps & { kind?: ButtonKind }) {
  return <Link {...rest} className={buttonClass(kind, className)} />;
}
