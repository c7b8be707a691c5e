import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterEach, beforeEach, expect, it } from "vitest";
import { sourceDigest } from "./sourceDigest.mjs";

let root = "";
const put = (path: string, text: string) => writeFileSync(join(root, path), text);

beforeEach(() => {
  root = mkdtempSync(join(tmpdir(), "foldwright-digest-"));
  mkdirSync(join(root, "app"));
  put("app/page.tsx", "one");
  put("package-lock.json", "{}");
});
afterEach(() => rmSync(root, { recursive: true }));

it("is the same for the same sources", () => {
  expect(sourceDigest(root)).toBe(sourceDigest(root));
});

it.each([
  ["a changed source", "app/page.tsx", "two"],
  ["a new source", "app/layout.tsx", "one"],
  ["other packages", "package-lock.json", "{ }"],
])("changes with %s", (_, path, text) => {
  const before = sourceDigest(root);
  put(path, text);
  expect(sourceDigest(root)).not.toBe(before);
});

it("tells a moved text from two others", () => {
  put("app/a.ts", "xy");
  put("app/b.ts", "");
  const before = sourceDigest(root);
  put("app/a.ts", "x");
  put("app/b.ts", "y");
  expect(sourceDigest(root)).not.toBe(before);
});

it("does not care for tests, nor for what is not built", () => {
  const before = sourceDigest(root);
  put("app/page.test.tsx", "test");
  put("README.md", "text");
  expect(sourceDigest(root)).toBe(before);
});
