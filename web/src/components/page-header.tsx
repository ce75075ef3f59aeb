import type { ReactNode } from "react";
import { Link } from "react-router-dom";
import { Avatar } from "./avatar.tsx";
import { Button } from "./button.tsx";
import { Mark } from "./mark.tsx";
import { Menu } from "./menu.tsx";
import { useShortcutsDialog } from "./shortcuts.tsx";
import { ThemeButton } from "./theme-button.tsx";
import { useIsPhone } from "./use-media.ts";

export interface Crumb {
  label: string;
  to: string;
}

interface PageHeaderProps {
  /** Where the mark leads. */
  home: string;
  /** The pages above this one, outermost first. */
  trail?: readonly Crumb[];
  /** Where the person is. */
  title?: string;
  /** State of saving, one short phrase; read out when it changes. */
  state?: ReactNode;
  /** At most three; the last one is what the page is for. On the phone they stand in a menu. */
  actions?: ReactNode;
  /** Who is signed in, how many things wait for them, and the links and buttons of their own menu. */
  person?: { name: string; waiting: number; items: ReactNode };
}

/** The bar at the head of every page, 60 px: mark, where one is, saving, actions, theme, keys, person. */
export function PageHeader({ home, trail = [], title, state, actions, person }: PageHeaderProps) {
  const isPhone = useIsPhone();
  const shortcuts = useShortcutsDialog();
  return (
    <header className="sticky top-0 z-20 border-b border-line bg-paper print:hidden">
      <div className="page-width flex h-(--header) items-center gap-4">
        <Link
          to={home}
          className="flex shrink-0 items-center gap-2.5 text-18 font-bold"
          aria-label="Restband, all projects"
        >
          <Mark />
          {!isPhone && <span>Restband</span>}
        </Link>
        {title !== undefined && <Whereabouts trail={trail} title={title} isPhone={isPhone} />}
        {state && (
          <span
            role="status"
            className="min-w-0 text-13 text-quiet max-desk:line-clamp-3 max-desk:max-w-[34%] max-desk:shrink-0 max-desk:leading-[1.2] desk:truncate"
          >
            {state}
          </span>
        )}
        <div className="ml-auto flex shrink-0 items-center gap-3">
          {isPhone && actions ? (
            <Menu label="Actions">
              <div className="flex flex-col gap-2 p-1">{actions}</div>
              <MenuPart>
                <div className="flex gap-2">
                  <Tools onShortcuts={shortcuts.open} />
                </div>
              </MenuPart>
              {person && <MenuPart>{person.items}</MenuPart>}
            </Menu>
          ) : (
            <>
              {actions}
              <Tools onShortcuts={shortcuts.open} />
              {person && <PersonMenu {...person} />}
            </>
          )}
        </div>
      </div>
      {shortcuts.dialog}
    </header>
  );
}

function MenuPart({ children }: { children: ReactNode }) {
  return <div className="border-t border-line pt-1">{children}</div>;
}

function Tools({ onShortcuts }: { onShortcuts: () => void }) {
  return (
    <>
      <ThemeButton />
      <Button
        kind="quiet"
        aria-label="Keyboard shortcuts"
        title="Keyboard shortcuts"
        className="max-desk:px-2.5!"
        onClick={onShortcuts}
      >
        <span className="font-bold">?</span>
        <span className="desk:hidden">keyboard</span>
      </Button>
    </>
  );
}

function PersonMenu({ name, waiting, items }: { name: string; waiting: number; items: ReactNode }) {
  const label = waiting > 0 ? `${name}, your account, ${waiting} waiting` : `${name}, your account`;
  return (
    <Menu
      label={<WaitingAvatar name={name} waiting={waiting} />}
      name={label}
      kind="quiet"
      buttonClassName="rounded-full"
    >
      {items}
    </Menu>
  );
}

/** Initials, with the number of things that wait in a corner. */
function WaitingAvatar({ name, waiting }: { name: string; waiting: number }) {
  return (
    <span className="relative inline-flex">
      <Avatar name={name} />
      {waiting > 0 && (
        <span
          aria-hidden="true"
          className="figures absolute -top-1.5 -right-2 min-w-[18px] rounded-full border border-paper bg-ink px-1 text-[11px]/[16px] font-bold text-paper"
        >
          {waiting > 99 ? "99+" : waiting}
        </span>
      )}
    </span>
  );
}

function Whereabouts({ trail, title, isPhone }: { trail: readonly Crumb[]; title: string; isPhone: boolean }) {
  if (isPhone) {
    const above = trail.at(-1);
    return (
      <nav aria-label="Where you are" className="min-w-0 leading-tight">
        {above && (
          <Link to={above.to} className="link block truncate text-13">
            {above.label}
          </Link>
        )}
        <span className="block truncate font-bold" aria-current="page">
          {title}
        </span>
      </nav>
    );
  }
  return (
    <nav aria-label="Where you are" className="min-w-0 border-l border-line pl-6 ml-5">
      <ol className="flex min-w-0 items-center gap-2">
        {trail.map(({ label, to }) => (
          <li key={to} className="flex min-w-0 shrink items-center gap-2">
            <Link to={to} className="link truncate">
              {label}
            </Link>
            <span aria-hidden="true" className="text-quiet">
              /
            </span>
          </li>
        ))}
        <li className="truncate font-bold" aria-current="page">
          {title}
        </li>
      </ol>
    </nav>
  );
}
