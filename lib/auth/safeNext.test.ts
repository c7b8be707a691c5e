import { expect, it } from "vitest";
import { safeNext } from "./safeNext";

it.each(["/parts", "/parts?q=a b&page=2", "/sheets/1#step-2", "/"])("keeps %s", (path) => {
  expect(safeNext(path)).toBe(path);
});

it.each([null, undefined, "", "parts", "//elsewhere.example", "/\\elsewhere.example", "https://elsewhere.example", "javascript:alert(1)", "/\t/elsewhere.example", "/a\\b"])("leads %j home", (path) => {
  expect(safeNext(path)).toBe("/");
});
