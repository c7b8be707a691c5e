import { expect, it } from "vitest";
import { installedMatchesLock } from "./installedMatchesLock.mjs";

const wanted = { packages: { "": {}, "node_modules/a": { version: "1.0.0" }, "node_modules/b": { version: "2.0.0", optional: true } } };

it("accepts what the lock asks for", () => {
  expect(installedMatchesLock(wanted, { packages: { "node_modules/a": { version: "1.0.0" }, "node_modules/b": { version: "2.0.0" } } })).toBe(true);
});

it("accepts that a package for other systems is missing", () => {
  expect(installedMatchesLock(wanted, { packages: { "node_modules/a": { version: "1.0.0" } } })).toBe(true);
});

it("does not ask for what the lock itself calls extraneous", () => {
  const lock = { packages: { ...wanted.packages, "node_modules/c": { version: "3.0.0", extraneous: true } } };
  expect(installedMatchesLock(lock, { packages: { "node_modules/a": { version: "1.0.0" } } })).toBe(true);
});

it.each([
  ["nothing installed", null],
  ["a package missing", { packages: { "node_modules/b": { version: "2.0.0" } } }],
  ["another version", { packages: { "node_modules/a": { version: "1.0.1" } } }],
  ["another version of an optional one", { packages: { "node_modules/a": { version: "1.0.0" }, "node_modules/b": { version: "2.1.0" } } }],
])("wants an installation: %s", (_, installed) => {
  expect(installedMatchesLock(wanted, installed)).toBe(false);
});
