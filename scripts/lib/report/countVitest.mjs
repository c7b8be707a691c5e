/** @typedef {{ name: string, message: string }} Failure @typedef {{ passed: number, failed: number, skipped: number, failures: Failure[] }} Count */
/** @typedef {{ status: string, fullName?: string, title?: string, failureMessages?: string[] }} VitestCase */
/** @typedef {{ name: string, status: string, message?: string, assertionResults?: VitestCase[] }} VitestFile */

/**
 * Counts a JSON report of vitest. A file that could not even be loaded has no tests to its name: it counts as one failure.
 * @param {{ success?: boolean, testResults?: VitestFile[] }} report
 * @param {string} root to shorten file names
 * @returns {Count}
 */
export function countVitest(report, root) {
  /** @type {Count} */
  const count = { passed: 0, failed: 0, skipped: 0, failures: [] };
  for (const file of report.testResults ?? []) {
    const name = file.name.replace(`${root}/`, "");
    const cases = file.assertionResults ?? [];
    for (const test of cases) addCase(count, name, test);
    if (file.status === "failed" && !cases.some((test) => test.status === "failed")) {
      count.failed += 1;
      count.failures.push({ name, message: file.message || "The file failed outside its tests." });
    }
  }
  if (report.success === false && count.failed === 0) {
    count.failed += 1;
    count.failures.push({ name: "vitest", message: "The run failed outside the tests (set-up, unhandled error)." });
  }
  return count;
}

/** @param {Count} count @param {string} file @param {VitestCase} test */
function addCase(count, file, test) {
  if (test.status === "passed") count.passed += 1;
  else if (test.status === "failed") {
    count.failed += 1;
    count.failures.push({ name: `${file}: ${test.fullName ?? test.title ?? ""}`, message: (test.failureMessages ?? []).join("\n") });
  } else count.skipped += 1;
}
