import { fileURLToPath } from "node:url";
import tailwindcss from "@tailwindcss/vite";
import react from "@vitejs/plugin-react";
import { defineConfig } from "vite";
import { licences } from "./licences-plugin.ts";

const apiPort = process.env.RESTBAND_API_PORT ?? "4780";
const workspaces = ["../solver", "../api", "."].map((path) => fileURLToPath(new URL(path, import.meta.url)));

export default defineConfig({
  plugins: [react(), tailwindcss(), licences(workspaces)],
  worker: { format: "es" },
  build: {
    outDir: "dist",
    sourcemap: false,
    // The content policy takes fonts and scripts from the server alone, never from data: addresses.
    assetsInlineLimit: 0,
    // Plotly is one large file by nature; it is loaded on its own and after the first paint.
    chunkSizeWarningLimit: 5000,
  },
  optimizeDeps: { include: ["plotly.js-dist-min", "react-plotly.js/factory", "comlink"] },
  server: {
    host: "127.0.0.1",
    strictPort: true,
    proxy: { "/api": { target: `http://127.0.0.1:${apiPort}` } },
  },
});
