import { expect, it } from "vitest";
import { countPlaywright } from "./countPlaywright.mjs";
import { countVitest } from "./countVitest.mjs";
import { totals } from "./totals.mjs";

const file = (status: string, cases: readonly string[], message = "") => ({
  name: "/clone/bending/a.test.ts",
  status,
  message,
  assertionResults: cases.map((outcome, i) => ({ status: outcome, fullName: `case ${i}`, failureMessages: outcome === "failed" ? ["expected 1"] : [] })),
});

it("counts what vitest reports, and names a failure by file and test", () => {
  const count = countVitest({ success: false, testResults: [file("failed", ["passed", "failed", "pending"])] }, "/clone");
  expect(count).toMatchObject({ passed: 1, failed: 1, skipped: 1 });
  expect(count.failures).toEqual([{ name: "bending/a.test.ts: case 1", message: "expected 1" }]);
});

it("counts a file that could not be loaded as a failure", () => {
  expect(countVitest({ success: false, testResults: [file("failed", [], "no such module")] }, "/clone")).toMatchObject({ passed: 0, failed: 1 });
});

it("counts a run that failed outside its tests as a failure", () => {
  expect(countVitest({ success: false, testResults: [file("passed", ["passed"])] }, "/clone")).toMatchObject({ passed: 1, failed: 1 });
});

const spec = (status: string) => ({
  title: `is ${status}`, file: "a.spec.ts", line: 3,
  tests: [{ status, results: status === "unexpected" ? [{ errors: [{ message: "\u001b[31mnot seen\u001b[39m" }] }] : [] }],
});

it("counts the browser tests of nested suites, and errors outside them", () => {
  const suites = [{ title: "a", specs: [spec("expected")], suites: [{ title: "b", specs: [spec("unexpected"), spec("flaky"), spec("skipped")] }] }];
  const count = countPlaywright({ suites, errors: [{ message: "no such browser" }] });
  expect(count).toMatchObject({ passed: 2, failed: 2, skipped: 1 });
  expect(count.failures[0]).toEqual({ name: "a.spec.ts:3: is unexpected", message: "not seen" });
});

const part = (passed: number, failed: number) => ({ part: "unit", count: { passed, failed, skipped: 0, failures: [] } });

it.each([
  ["all passed", [part(3, 0), part(2, 0)], "5 passed, 0 failed", 0],
  ["one failed", [part(3, 0), part(1, 1)], "4 passed, 1 failed", 1],
  ["a part in which nothing ran", [part(3, 0), part(0, 0)], "3 passed, 1 failed", 1],
  ["nothing at all", [], "0 passed, 1 failed", 1],
] as const)("ends with the sum: %s", (_, parts, line, code) => {
  expect(totals(parts)).toMatchObject({ line, code });
});
