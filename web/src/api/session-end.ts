import { sharedValue, useSharedValue } from "../shared-value.ts";

// True from the first call refused for want of a session until somebody signs in again. The page stays as it is
// meanwhile, with everything typed in it.
const hasEnded = sharedValue(false);

export const noteSessionEnd = () => hasEnded.set(true);
export const noteSessionStart = () => hasEnded.set(false);

/** Whether the session ended under a page that is still open. */
export const useHasSessionEnded = () => useSharedValue(hasEnded);
