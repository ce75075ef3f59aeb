const KEY = "restband-runner";
let own: string | null = null;

/** What this tab of the browser is called where it computes for others; the same after it is loaded again. */
export function runnerId(): string {
  own ??= remembered() ?? crypto.randomUUID();
  try {
    sessionStorage.setItem(KEY, own);
  } catch {
    // Storage is refused: the name lasts as long as the page.
  }
  return own;
}

function remembered(): string | null {
  try {
    return sessionStorage.getItem(KEY);
  } catch {
    return null;
  }
}
