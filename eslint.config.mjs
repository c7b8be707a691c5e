import { createTypeScriptImportResolver } from "eslint-import-resolver-typescript";
import importX from "eslint-plugin-import-x";
import nextVitals from "eslint-config-next/core-web-vitals";
import nextTypescript from "eslint-config-next/typescript";

/** One-way imports: `target` must never import anything under `from`. */
const zone = (target, from, message, except) => ({ target, from, message, ...(except ? { except } : {}) });

const outside = ["./app", "./components", "./lib", "./db", "./seeds", "./scripts", "./tests"];
const bendingOrder = [["core", "geometry", "handbook", "shopTable"], ["part", "tooling"], ["strokes"], ["clearance"], ["order", "setup", "findings", "exchange"], ["gauging"], ["plan"], ["whyNot"]];
const bendingZones = bendingOrder.flatMap((layer, i) =>
  layer.flatMap((folder) =>
    bendingOrder.slice(i + 1).flat().map((later) =>
      zone(`./bending/${folder}`, `./bending/${later}`, "bending/ imports to the left only: core, geometry, handbook, shopTable <- part, tooling <- strokes <- clearance <- order, setup, findings, exchange <- gauging <- plan <- whyNot."),
    ),
  ),
);

const zones = [
  ...outside.map((from) => zone("./bending", from, "bending/ is framework-free: it imports nothing of the product.")),
  ...bendingZones,
  zone("./db", "./app", "db/ never imports app."),
  zone("./db", "./components", "db/ never imports components."),
  zone("./db", "./lib", "db/ imports lib/env only.", ["./env.ts"]),
  zone("./lib", "./app", "lib/ never imports app."),
  zone("./lib", "./components", "lib/ never imports components."),
  ...["schemas", "format", "queries", "exchange", "csv", "calculator", "sheet", "step", "mail"].map((folder) =>
    zone(`./lib/${folder}`, "./db", "Only lib/services, lib/jobs and lib/auth touch the database.")),
  ...["schemas", "format", "queries", "csv", "calculator", "sheet"].map((folder) =>
    zone(`./lib/${folder}`, "./lib/services", "lib/services is for the server only.")),
  ...["./db", "./lib/services", "./lib/jobs", "./app"].map((from) =>
    zone("./components", from, "components/ imports ui, bending and lib/{queries,schemas,format,sheet} only.")),
  ...["parts", "tooling", "plans", "sheets", "floor", "queue", "account", "calculator", "bendTable", "materials", "settings"].flatMap((feature) =>
    ["parts", "tooling", "plans", "sheets", "floor", "queue", "account", "calculator", "bendTable", "materials", "settings"].filter((other) => other !== feature).map((other) =>
      zone(`./components/${feature}`, `./components/${other}`, "A feature does not import a sibling feature."))),
  zone("./app", "./db", "app/ goes through lib/services."),
];

const env = {
  selector: "MemberExpression[object.name='process'][property.name='env']",
  message: "process.env is read in lib/env.ts only.",
};

const config = [
  { ignores: [".next/**", "node_modules/**", ".data/**", "next-env.d.ts", "test-results/**", "playwright-report/**", "public/**"] },
  ...nextVitals,
  ...nextTypescript,
  {
    plugins: { "import-x": importX },
    settings: { "import-x/resolver-next": [createTypeScriptImportResolver({ project: "./tsconfig.json" })] },
    rules: {
      "import-x/no-restricted-paths": ["error", { zones }],
      "import-x/no-cycle": ["error", { ignoreExternal: true }],
      "@typescript-eslint/no-explicit-any": "error",
      "@typescript-eslint/ban-ts-comment": "error",
    },
  },
  {
    files: ["app/**", "components/**", "lib/**", "bending/**", "db/**", "seeds/**", "proxy.ts"],
    ignores: ["lib/env.ts"],
    rules: { "no-restricted-syntax": ["error", env] },
  },
  {
    files: ["bending/**/*.ts"],
    ignores: ["bending/**/*.test.ts", "bending/cli.ts"],
    rules: {
      "no-console": "error",
      "no-restricted-globals": ["error", "window", "document", "performance", "process"],
      "no-restricted-properties": ["error",
        { object: "Math", property: "random", message: "bending/ is deterministic." },
        { object: "Date", property: "now", message: "bending/ has no clock." }],
      "no-restricted-imports": ["error", { patterns: ["react", "react-dom", "three", "three/*", "@react-three/*", "knex", "pg", "next", "next/*", "node:*"] }],
    },
  },
  {
    // The command line's outermost file hands in the outside world; the geometry kernel is of it.
    files: ["bending/cli.ts"],
    rules: { "import-x/no-restricted-paths": ["error", { zones: zones.filter(({ target, from }) => target !== "./bending" || from !== "./lib") }] },
  },
  {
    files: ["components/**", "app/**"],
    ignores: ["components/preview/**"],
    rules: { "no-restricted-imports": ["error", { patterns: ["three", "three/*", "@react-three/*", "knex", "pg"] }] },
  },
];

export default config;
