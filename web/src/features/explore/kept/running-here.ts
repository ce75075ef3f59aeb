const KEY = "restband-running";
const MOST = 50;

/**
 * The explorations that this browser computes: begun, and neither done nor called off. What stands here goes on by itself
 * when its page is opened again.
 */
function all(): string[] {
  try {
    const kept: unknown = JSON.parse(localStorage.getItem(KEY) ?? "[]");
    return Array.isArray(kept) ? kept.filter((id) => typeof id === "string") : [];
  } catch {
    return [];
  }
}

function keep(ids: readonly string[]): void {
  try {
    localStorage.setItem(KEY, JSON.stringify(ids.slice(-MOST)));
  } catch {
    // Storage is refused: a reload then waits to be told to resume.
  }
}

export const isRunningHere = (id: string): boolean => all().includes(id);
export const noteRunning = (id: string): void => keep([...all().filter((each) => each !== id), id]);
export const noteStopped = (id: string): void => keep(all().filter((each) => each !== id));
