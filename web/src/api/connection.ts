import { sharedValue, useSharedValue } from "../shared-value.ts";

const lostSince = sharedValue<Date | null>(null);

/** Every call tells whether a server answered. */
export function noteConnection(isThere: boolean): void {
  const wasThere = lostSince.get() === null;
  if (isThere !== wasThere) lostSince.set(isThere ? null : new Date());
}

/** The time the connection was lost, or null while the server answers. */
export const useLostSince = () => useSharedValue(lostSince);
