import { say } from "../say.mjs";

const LONGEST = 40;

/** @param {string} part @param {import("./countVitest.mjs").Count} count */
export function printFailures(part, count) {
  for (const { name, message } of count.failures) {
    const lines = message.trimEnd().split("\n");
    say(`\n  FAILED ${part}: ${name}`);
    for (const line of lines.slice(0, LONGEST)) say(`    ${line}`);
    if (lines.length > LONGEST) say(`    ... ${lines.length - LONGEST} lines more`);
  }
  if (count.passed + count.failed === 0) say(`\n  FAILED ${part}: nothing ran`);
  if (count.failures.length > 0) say("");
}
