import { useCallback, useSyncExternalStore } from "react";

/** Whether a media query holds now; false where there is no screen to ask. */
export function useMedia(query: string): boolean {
  const subscribe = useCallback(
    (listener: () => void) => {
      const list = window.matchMedia?.(query);
      list?.addEventListener("change", listener);
      return () => list?.removeEventListener("change", listener);
    },
    [query],
  );
  return useSyncExternalStore(subscribe, () => window.matchMedia?.(query)?.matches ?? false);
}

/** True below 760 px, where pages are one column. */
export function useIsPhone(): boolean {
  return useMedia("(max-width: 759.98px)");
}
