import { defineConfig } from "vite";

/** Bundles our own TypeScript, the solver's too; packages of npm stay outside and are loaded from node_modules. */
export default defineConfig({
  build: {
    ssr: true,
    target: "node20",
    outDir: "dist",
    rollupOptions: {
      input: {
        server: "src/server.ts",
        prepare: "src/prepare.ts",
        "create-administrator": "src/create-administrator.ts",
        "recompute-worker": "src/revisions/recompute-worker.ts",
      },
      // All beside each other: what starts a thread finds the thread's file there.
      output: { chunkFileNames: "[name]-[hash].js" },
    },
  },
  ssr: { noExternal: ["@restband/solver"] },
});
