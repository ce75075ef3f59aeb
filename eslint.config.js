import eslint from "@eslint/js";
import reactHooks from "eslint-plugin-react-hooks";
import tseslint from "typescript-eslint";

/*
 * Who may import whom. Each rule names the imports a folder may NOT make, as a regular expression on the path written in
 * the import. Only one such rule can be in force for a file, so each folder lists all of its own (the last match counts).
 */

/** A place that may be imported from anywhere in the solver: plain contracts, no code that runs. */
const contracts = ["field\\.ts$", "result\\.ts$", "options\\.ts$"];

/** Refuses what leaves a folder, files lying `depth` folders below its parent, unless it starts with one of `allowed`. */
const leaving = (depth, allowed, message) => ({
  regex: `^(?:\\.\\./){${depth}}(?!(?:${[...allowed, "$^"].join("|")}))`,
  message,
});
const packages = (names, message) => ({ regex: `^(?:${names.join("|")})(?:/|$)`, message });

const otherWorkspaces = packages(["@restband/(?:api|web)"], "The solver stands alone.");
const node = packages(
  ["node:", "fs", "path", "os", "url"],
  "The solver runs in browsers: only cli.ts and cli/ may use node.",
);
const integrator = packages(["odex"], "odex is used through motion/adaptive/vendor-odex.js only.");
const zod = packages(["zod"], "Take z from scenario/zod.ts, or from @restband/solver outside the solver.");
const hashes = packages(["@noble/hashes"], "Digests are made in solver/src/scenario only.");
const numericPackages = packages(
  ["pure-rand", "ml-levenberg-marquardt", "ml-matrix", "fft\\.js"],
  "Numeric packages are used in solver/src/numerics only.",
);

const solverAnywhere = [otherWorkspaces, node, integrator, zod, hashes, numericPackages];
const without = (...rules) => solverAnywhere.filter((rule) => !rules.includes(rule));
const restrict = (patterns) => ({ "no-restricted-imports": ["error", { patterns }] });

/** Import rules of one folder of the solver, for its own files and those one folder deeper. */
const solverFolder = (name, allowed, message, anywhere = solverAnywhere) =>
  [1, 2].map((depth) => ({
    files: [`solver/src/${name}/${"*/".repeat(depth - 1)}*.ts`],
    rules: restrict([...anywhere, leaving(depth, allowed, message)]),
  }));

const solverRules = [
  { files: ["solver/src/**/*.ts"], rules: restrict(solverAnywhere) },
  { files: ["solver/src/cli.ts", "solver/src/cli/*.ts"], rules: restrict(without(node)) },
  { files: ["solver/src/scenario/*.ts"], rules: restrict(without(hashes)) },
  { files: ["solver/src/scenario/zod.ts"], rules: restrict(without(zod)) },
  ...solverFolder("numerics", [], "numerics knows nothing else of the solver.", without(numericPackages)),
  ...["friction", "excitation", "solid"].flatMap((kind) =>
    solverFolder(kind, ["numerics/", ...contracts], "A kind knows its own folder and numerics only."),
  ),
  ...solverFolder(
    "motion",
    [
      "friction/friction-law\\.ts$",
      "excitation/excitation-term\\.ts$",
      "solid/solid-damping\\.ts$",
      "scenario/(?:problem|scenario)\\.ts$",
      "numerics/",
      ...contracts,
    ],
    "motion knows the contracts of laws and terms, never a single one, and neither quantities nor the run around it.",
  ),
  ...["quantities", "textbook"].flatMap((name) =>
    solverFolder(
      name,
      ["motion/[^/]+\\.ts$", "scenario/", "quantities/", "numerics/", "excitation/excitation-term\\.ts$", ...contracts],
      "quantities and textbook companions read a motion and a scenario, never an integrator.",
    ),
  ),
  ...["explore", "identify", "script"].flatMap((name) =>
    solverFolder(
      name,
      [
        "simulate\\.ts$",
        "version\\.ts$",
        "limits\\.ts$",
        "json-text\\.ts$",
        "numerics/",
        "scenario/",
        "textbook/",
        "quantities/index\\.ts$",
        ...contracts,
      ],
      "explore, identify and script use simulate, never the inside of motion.",
    ),
  ),
];

const throughTheDoor = {
  regex: "^@restband/solver/|^(?:\\.\\./)+solver/",
  message: "Import from @restband/solver: its index.ts is the door.",
};
const noWeb = { regex: "^@restband/web|^(?:\\.\\./)+web/", message: "The server knows nothing of the page." };
const framework = packages(["express", "knex", "mysql2"], "Schemas are shared with the page: zod and the solver only.");
const foreignStore = {
  regex: "^\\.\\./[^/]+/[^/]+-store(?:\\.ts)?$",
  message: "Ask the other resource's service: its store is its own.",
};
const apiAnywhere = [zod, throughTheDoor, noWeb];

const apiRules = [
  { files: ["api/**/*.ts", "migrations/*.ts"], rules: restrict(apiAnywhere) },
  { files: ["api/src/*/*.ts"], rules: restrict([...apiAnywhere, foreignStore]) },
  {
    files: ["api/src/contract.ts", "api/src/**/*-schema.ts"],
    rules: restrict([...apiAnywhere, foreignStore, framework]),
  },
  {
    files: ["migrations/*.ts"],
    rules: restrict([
      { regex: "^\\.\\./|^@restband/", message: "A migration never changes with the code: no imports." },
    ]),
  },
];

const contractOnly = {
  regex: "^@restband/api(?!/(?:addresses|contract)$)|^(?:\\.\\./)+api/src",
  message: "Of the server the page knows the contract and its addresses only.",
};
const webAnywhere = [zod, throughTheDoor, contractOnly];

/** Import rules of one folder of the page: `upper` lists the folders above it, which it may not know. */
const webFolder = (name, upper, extra = () => []) =>
  [1, 2, 3].map((depth) => ({
    files: [`web/src/${name}/${"*/".repeat(depth - 1)}*.{ts,tsx}`],
    rules: restrict([
      ...webAnywhere,
      {
        regex: `^(?:\\.\\./){${depth}}(?:${[...upper, "app\\.tsx$", "main\\.tsx$", "routes\\.tsx$"].join("|")})`,
        message: `Imports go from pages to features to the rest: ${name} may not look upwards.`,
      },
      ...extra(depth),
    ]),
  }));
const otherFeature = (depth) =>
  depth < 2 ? [] : [{ regex: `^(?:\\.\\./){${depth - 1}}[a-z]`, message: "A feature does not know another feature." }];

const webRules = [
  { files: ["web/src/**/*.{ts,tsx}"], rules: restrict(webAnywhere) },
  ...webFolder("pages", []),
  ...webFolder("features", ["pages/"], otherFeature),
  ...webFolder("components", ["pages/", "features/", "api/", "compute/"]),
  ...["api", "compute", "format"].flatMap((name) => webFolder(name, ["pages/", "features/", "components/"])),
];

/** Names that plain scripts find in their surroundings; the compiler knows those of TypeScript files. */
const known = (names) => ({
  languageOptions: { globals: Object.fromEntries(names.split(" ").map((name) => [name, "readonly"])) },
});

const sizes = (functionLines) => ({
  "max-lines": ["error", { max: 300, skipBlankLines: true, skipComments: true }],
  "max-lines-per-function": ["error", { max: functionLines, skipBlankLines: true, skipComments: true }],
});

export default tseslint.config(
  { ignores: ["**/dist/", ".local/", "node_modules/", "**/vendor-odex.*", "**/coverage/"] },
  { linterOptions: { reportUnusedDisableDirectives: "error" } },
  eslint.configs.recommended,
  {
    files: ["**/*.{js,mjs,cjs}"],
    ...known("process console module URL Buffer fetch AbortSignal setTimeout clearTimeout"),
  },
  { files: ["web/public/*.js"], ...known("document window localStorage matchMedia") },
  {
    files: ["**/*.{ts,tsx}"],
    extends: [tseslint.configs.recommendedTypeChecked],
    languageOptions: {
      parserOptions: {
        project: "{solver,api,web,test}/tsconfig.json",
        tsconfigRootDir: import.meta.dirname,
      },
    },
    rules: {
      "@typescript-eslint/no-explicit-any": "error",
      "@typescript-eslint/consistent-type-imports": ["error", { fixStyle: "inline-type-imports" }],
      "@typescript-eslint/switch-exhaustiveness-check": ["error", { considerDefaultExhaustiveForUnions: true }],
      // An async handler given to a component or to express 5 is meant: both await it.
      "@typescript-eslint/no-misused-promises": ["error", { checksVoidReturn: false }],
      // Contracts are objects of closures: nothing here is bound to a `this`.
      "@typescript-eslint/unbound-method": "off",
      "@typescript-eslint/no-unused-vars": ["error", { argsIgnorePattern: "^_", varsIgnorePattern: "^_" }],
      "no-restricted-exports": ["error", { restrictDefaultExports: { direct: true } }],
      eqeqeq: "error",
      ...sizes(60),
    },
  },
  {
    files: ["solver/src/cli.ts", "solver/src/cli/*.ts"],
    languageOptions: { parserOptions: { project: "solver/tsconfig.cli.json" } },
  },
  { files: ["web/**/*.tsx"], rules: sizes(100) },
  {
    files: ["web/**/*.{ts,tsx}"],
    plugins: { "react-hooks": reactHooks },
    rules: {
      "react-hooks/rules-of-hooks": "error",
      "react-hooks/exhaustive-deps": "error",
      "react-hooks/static-components": "error",
      "react-hooks/set-state-in-render": "error",
      "react-hooks/purity": "error",
    },
  },
  {
    files: ["solver/src/**/*.ts"],
    rules: {
      "no-restricted-globals": ["error", { name: "Date", message: "A run depends on its scenario alone." }],
      "no-restricted-properties": [
        "error",
        {
          object: "Math",
          property: "random",
          message: "A run depends on its scenario alone: use numerics' seeded random.",
        },
      ],
    },
  },
  ...solverRules,
  ...apiRules,
  ...webRules,
  {
    files: ["test/**/*.{ts,tsx}"],
    rules: {
      // A suite is one function around its tests.
      "max-lines-per-function": "off",
      ...restrict([zod, integrator]),
    },
  },
  // Tools ask for a default export in their configuration.
  { files: ["**/{vite,vitest}.config.ts"], rules: { "no-restricted-exports": "off" } },
);
