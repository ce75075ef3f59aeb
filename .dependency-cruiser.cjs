/** The big directions between parts, and cycles anywhere: lint checks single imports, this the graph they make. */
module.exports = {
  forbidden: [
    { name: "no-cycle", severity: "error", from: {}, to: { circular: true } },
    { name: "no-unresolvable", severity: "error", from: {}, to: { couldNotResolve: true } },
    {
      name: "solver-stands-alone",
      severity: "error",
      from: { path: "^solver/" },
      to: { path: "^(api|web|migrations)/" },
    },
    { name: "server-not-to-page", severity: "error", from: { path: "^api/" }, to: { path: "^web/" } },
    {
      name: "page-to-server-by-contract",
      severity: "error",
      from: { path: "^web/" },
      to: { path: "^api/", pathNot: "^api/src/(contract|addresses)\\.ts$" },
    },
    {
      name: "solver-through-its-door",
      severity: "error",
      from: { path: "^(api|web)/" },
      to: { path: "^solver/", pathNot: "^solver/src/index\\.ts$" },
    },
    {
      name: "contract-shared-with-page",
      comment: "What the page bundles of the server: schemas and addresses only.",
      severity: "error",
      from: { path: "^api/src/(contract|.*-schema)\\.ts$" },
      to: { path: "^api/src/", pathNot: "(-schema|/addresses)\\.ts$" },
    },
    {
      name: "store-is-its-resource's-own",
      severity: "error",
      from: { path: "^api/src/([^/]+)/" },
      to: { path: "^api/src/[^/]+/[^/]+-store\\.ts$", pathNot: "^api/src/$1/" },
    },
  ],
  options: {
    doNotFollow: { path: "node_modules" },
    tsPreCompilationDeps: true,
    tsConfig: { fileName: "tsconfig.base.json" },
    enhancedResolveOptions: {
      extensions: [".ts", ".tsx", ".js", ".mjs", ".cjs"],
      exportsFields: ["exports"],
      conditionNames: ["import", "types", "default"],
    },
  },
};
