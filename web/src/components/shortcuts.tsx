import { useEffect, useRef, useState } from "react";
import { sharedValue, useSharedValue } from "../shared-value.ts";
import { Checkbox } from "./choices.tsx";
import { Dialog } from "./dialog.tsx";

interface Shortcut {
  /** As `KeyboardEvent.key` has it, with `Ctrl+` or `Shift+` before it where needed: "n", "?", "ArrowRight", "Ctrl+z". */
  keys: string;
  label: string;
  run: () => void;
}

const storageKey = "restband-shortcuts";
const shortcuts = sharedValue<readonly Shortcut[]>([]);
const areSingleKeysOn = sharedValue(read());

function read(): boolean {
  try {
    return localStorage.getItem(storageKey) !== "off";
  } catch {
    return true;
  }
}

// Single keys can be turned off, for those who speak to their computer or brush the keyboard (WCAG 2.1.4).
function allowSingleKeys(next: boolean): void {
  areSingleKeysOn.set(next);
  try {
    localStorage.setItem(storageKey, next ? "on" : "off");
  } catch {
    // Storage is refused: the choice lasts as long as the page.
  }
}

const writingTags = new Set(["INPUT", "TEXTAREA", "SELECT"]);

function isWriting(target: EventTarget | null): boolean {
  return target instanceof HTMLElement && (writingTags.has(target.tagName) || target.isContentEditable);
}

/** A space pressed on a button or link is the button's own. */
const isPressing = ({ key, target }: KeyboardEvent): boolean =>
  key === " " && target instanceof Element && target.closest("button, a, summary") !== null;

function keysOf(event: KeyboardEvent): string {
  const held = event.ctrlKey || event.metaKey ? "Ctrl+" : "";
  return held + (event.shiftKey && event.key.length > 1 ? "Shift+" : "") + letterOf(event);
}

/** A letter is large with Shift and small without, also while Caps Lock turns it round. */
function letterOf({ key, shiftKey }: KeyboardEvent): string {
  if (!/^\p{L}$/u.test(key)) return key;
  return shiftKey ? key.toUpperCase() : key.toLowerCase();
}

function press(event: KeyboardEvent): void {
  if (event.defaultPrevented || event.altKey || isPressing(event)) return;
  const keys = keysOf(event);
  const isSingle = !keys.startsWith("Ctrl+");
  if (isSingle && (!areSingleKeysOn.get() || isWriting(event.target) || document.querySelector("dialog[open]"))) return;
  const shortcut = [...shortcuts.get()].reverse().find((each) => each.keys === keys);
  if (!shortcut) return;
  event.preventDefault();
  shortcut.run();
}

if (typeof document !== "undefined") document.addEventListener("keydown", press);

/**
 * A key for as long as the component is there; the `?` dialog lists it by its label. Keys without Ctrl do nothing while
 * a person writes or a dialog is open. Where two components name the same keys, the later one has it.
 */
export function useShortcut(keys: string, label: string, run: () => void): void {
  const latest = useRef(run);
  useEffect(() => {
    latest.current = run;
  });
  useEffect(() => {
    const shortcut = { keys, label, run: () => latest.current() };
    shortcuts.set([...shortcuts.get(), shortcut]);
    return () => shortcuts.set(shortcuts.get().filter((each) => each !== shortcut));
  }, [keys, label]);
}

const names: Record<string, string> = { ArrowLeft: "←", ArrowRight: "→", ArrowUp: "↑", ArrowDown: "↓", " ": "Space" };

function spelled(keys: string): string[] {
  return keys.split(/\+(?=.)/u).map((key) => names[key] ?? (key.length === 1 ? key.toUpperCase() : key));
}

/** Lists the keys of the page; opened by `?` and by the header's button. */
export function useShortcutsDialog() {
  const [isOpen, setOpen] = useState(false);
  useShortcut("?", "Show this list", () => setOpen(true));
  return { open: () => setOpen(true), dialog: <ShortcutsDialog isOpen={isOpen} onClose={() => setOpen(false)} /> };
}

function ShortcutsDialog({ isOpen, onClose }: { isOpen: boolean; onClose: () => void }) {
  const listed = useSharedValue(shortcuts);
  const areOn = useSharedValue(areSingleKeysOn);
  return (
    <Dialog isOpen={isOpen} title="Keyboard" onClose={onClose}>
      <dl className="mb-5">
        {listed.map(({ keys, label }) => (
          <div key={keys + label} className="flex items-center justify-between gap-6 border-t border-line py-2">
            <dt>{label}</dt>
            <dd className="flex gap-1">
              {spelled(keys).map((key) => (
                <kbd key={key} className="figures rounded border border-edge bg-raised px-1.5 text-13">
                  {key}
                </kbd>
              ))}
            </dd>
          </div>
        ))}
      </dl>
      <Checkbox
        label="Use single keys"
        help="Without them, keys with Ctrl still work and everything stays within reach of Tab."
        checked={areOn}
        onChange={(event) => allowSingleKeys(event.target.checked)}
      />
    </Dialog>
  );
}
