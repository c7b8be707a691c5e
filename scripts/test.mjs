import { browserTests } from "./lib/parts/browserTests.mjs";
import { build } from "./lib/parts/build.mjs";
import { endRunning } from "./lib/machine/run.mjs";
import { ensureBinaries } from "./lib/postgres/ensureBinaries.mjs";
import { ensureNodeModules } from "./lib/packages/ensureNodeModules.mjs";
import { lint } from "./lib/parts/lint.mjs";
import { PlainError } from "./lib/plainError.mjs";
import { printFailures } from "./lib/report/printFailures.mjs";
import { requireNode } from "./lib/machine/requireNode.mjs";
import { say, secondsSince } from "./lib/say.mjs";
import { totals } from "./lib/report/totals.mjs";
import { typeCheck } from "./lib/parts/typeCheck.mjs";
import { vitestProject } from "./lib/parts/vitestProject.mjs";

/** @typedef {import("./lib/report/countVitest.mjs").Count} Count */

const HELP = `npm test [-- PART ... [-- FILTER ...]]

Parts: types, lint, unit, integration, build, browser; all of them when none is named. Filters are file names or
parts of them, for vitest and the browser tests.`;

/** In this order; the two that read the sources once and use one core each go side by side. */
const TOGETHER = /** @type {const} */ ([["types", "lint"], ["unit"], ["integration"], ["build"], ["browser"]]);

/** @type {() => Promise<void>} */
let undo = async () => undefined;

for (const signal of /** @type {const} */ (["SIGINT", "SIGTERM", "SIGHUP"])) {
  process.on(signal, async () => {
    await endRunning();
    await undo();
    process.exit(130);
  });
}

/** @param {readonly string[]} filters */
const partsFor = (filters) => ({
  types: typeCheck,
  lint,
  unit: () => vitestProject("unit", filters),
  integration: async () => {
    await ensureBinaries();
    return vitestProject("integration", filters);
  },
  build,
  browser: () => browserTests(filters, (end) => { undo = end; }),
});

/** @param {string} part @param {() => Promise<Count>} work */
async function runPart(part, work) {
  const since = Date.now();
  /** @type {Count} */
  let count;
  try {
    count = await work();
  } catch (error) {
    const message = error instanceof PlainError ? error.message : error instanceof Error ? error.stack ?? error.message : String(error);
    count = { passed: 0, failed: 1, skipped: 0, failures: [{ name: "could not run", message }] };
  }
  const skipped = count.skipped > 0 ? `, ${count.skipped} skipped` : "";
  say(`${part.padEnd(12)} ${count.passed} passed, ${count.failed} failed${skipped} (${secondsSince(since)})`);
  printFailures(part, count);
  return { part, count };
}

async function test() {
  const [wanted, filters] = split(process.argv.slice(2));
  if (wanted.includes("--help")) return say(HELP);
  const parts = partsFor(filters);
  const unknown = wanted.find((part) => !(part in parts));
  if (unknown !== undefined) throw new PlainError(`There is no part "${unknown}".\n\n${HELP}`);
  const since = Date.now();
  requireNode();
  await ensureNodeModules();
  const done = [];
  for (const group of TOGETHER) {
    const names = group.filter((part) => wanted.length === 0 || wanted.includes(part));
    done.push(...(await Promise.all(names.map((part) => runPart(part, parts[part])))));
  }
  const sum = totals(done);
  say(`\nAll in ${secondsSince(since)}${sum.skipped > 0 ? `; ${sum.skipped} skipped` : ""}`);
  say(sum.line);
  process.exitCode = sum.code;
}

/** @param {readonly string[]} parameters @returns {[readonly string[], readonly string[]]} */
function split(parameters) {
  const at = parameters.indexOf("--");
  return at < 0 ? [parameters, []] : [parameters.slice(0, at), parameters.slice(at + 1)];
}

try {
  await test();
} catch (error) {
  say(error instanceof PlainError ? error.message : error instanceof Error ? error.stack ?? error.message : String(error));
  say("0 passed, 1 failed");
  process.exitCode = 1;
}
