/** @typedef {import("./countVitest.mjs").Count} Count */
/** @typedef {{ message?: string, stack?: string }} PlaywrightError */
/** @typedef {{ status: string, projectName?: string, results?: { errors?: PlaywrightError[] }[] }} PlaywrightTest */
/** @typedef {{ title: string, file?: string, line?: number, suites?: PlaywrightSuite[], specs?: { title: string, file: string, line: number, tests: PlaywrightTest[] }[] }} PlaywrightSuite */

const COLOURS = new RegExp(`${String.fromCharCode(27)}\\[[0-9;]*m`, "g");

/** @param {PlaywrightError[]} errors */
const textOf = (errors) => errors.map((error) => error.message ?? error.stack ?? "").join("\n").replace(COLOURS, "");

/**
 * Counts a JSON report of the browser tests; errors outside any test count as one failure each.
 * @param {{ suites?: PlaywrightSuite[], errors?: PlaywrightError[] }} report
 * @returns {Count}
 */
export function countPlaywright(report) {
  /** @type {Count} */
  const count = { passed: 0, failed: 0, skipped: 0, failures: [] };
  for (const suite of report.suites ?? []) addSuite(count, suite);
  for (const error of report.errors ?? []) {
    count.failed += 1;
    count.failures.push({ name: "browser tests", message: textOf([error]) });
  }
  return count;
}

/** @param {Count} count @param {PlaywrightSuite} suite */
function addSuite(count, suite) {
  for (const spec of suite.specs ?? []) {
    for (const test of spec.tests) {
      if (test.status === "expected" || test.status === "flaky") count.passed += 1;
      else if (test.status === "skipped") count.skipped += 1;
      else {
        count.failed += 1;
        const message = textOf((test.results ?? []).flatMap((result) => result.errors ?? []));
        count.failures.push({ name: `${spec.file}:${spec.line}: ${spec.title}`, message });
      }
    }
  }
  for (const inner of suite.suites ?? []) addSuite(count, inner);
}
