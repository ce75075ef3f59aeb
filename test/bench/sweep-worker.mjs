import { register } from "tsx/esm/api";

// Workers do not take over the loader of the thread that starts them.
register();
await import("./sweep-worker.ts");
