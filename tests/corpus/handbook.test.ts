import { readFileSync, readdirSync } from "node:fs";
import { join } from "node:path";
import { describe, expect, test } from "vitest";
import type { Corpus } from "./handbookCase";
import { handbookFormulas } from "./handbookFormulas";

const folder = join(import.meta.dirname, "handbook");
const files = readdirSync(folder).filter((name) => name.endsWith(".json"));

test("every formula of the handbook has cases", () => {
  const asked = files.map((file) => (JSON.parse(readFileSync(join(folder, file), "utf8")) as Corpus).formula);
  expect([...asked].sort()).toEqual(Object.keys(handbookFormulas).sort());
});

describe.each(files)("%s", (file) => {
  const corpus = JSON.parse(readFileSync(join(folder, file), "utf8")) as Corpus;
  test.each(corpus.cases.map((entry) => ({ ...entry, name: `[${entry.mark}] ${JSON.stringify(entry.input)}` })))("$name", (entry) => {
    expect(["V", "M", "C"]).toContain(entry.mark);
    expect(entry.source).not.toBe("");
    const actual = handbookFormulas[corpus.formula]?.(entry.input) ?? NaN;
    expect(Math.abs(actual - entry.expected), `${actual} against ${entry.expected} of ${entry.source}`).toBeLessThanOrEqual(entry.tolerance);
  });

  test.each((corpus.disagreements ?? []).map((entry) => ({ ...entry, title: `[${entry.mark}] not followed: ${entry.name}` })))("$title", (entry) => {
    expect(entry.source).not.toBe("");
    expect(entry.why).not.toBe("");
    const actual = handbookFormulas[corpus.formula]?.(entry.input) ?? NaN;
    expect(Math.abs(actual - entry.followed), `${actual} against ${entry.followed}`).toBeLessThanOrEqual(entry.tolerance);
    expect(Math.abs(entry.published - entry.followed)).toBeGreaterThan(entry.tolerance);
  });
});
