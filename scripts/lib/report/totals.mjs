/** @typedef {import("./countVitest.mjs").Count} Count */

/**
 * The sum of all parts. A part in which nothing ran is a failure of its own: silence is no pass.
 * @param {readonly { part: string, count: Count }[]} parts
 * @returns {{ passed: number, failed: number, skipped: number, line: string, code: number }}
 */
export function totals(parts) {
  const sum = { passed: 0, failed: 0, skipped: 0 };
  for (const { count } of parts) {
    sum.passed += count.passed;
    sum.failed += count.failed + (count.passed + count.failed === 0 ? 1 : 0);
    sum.skipped += count.skipped;
  }
  if (parts.length === 0) sum.failed += 1;
  return { ...sum, line: `${sum.passed} passed, ${sum.failed} failed`, code: sum.failed === 0 && sum.passed > 0 ? 0 : 1 };
}
