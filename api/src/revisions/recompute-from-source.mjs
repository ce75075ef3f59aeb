import { register } from "tsx/esm/api";

// A thread does not take the loader over from who starts it.
register();
await import("./recompute-worker.ts");
