import fc from "fast-check";
import { expect, it } from "vitest";
import { unstorable } from "./unstorable";

it("names the place of a text that cannot be stored", () => {
  expect(unstorable({ a: [{ b: "x\u0000" }], c: "fine\n\ttext" })).toEqual([{ path: "a[0].b", message: "must not contain control characters" }]);
  expect(unstorable({ "a\u0000": 1 }, "document")[0]?.path).toBe("document");
  expect(unstorable("x".repeat(2001))[0]?.message).toContain("2000");
  expect(unstorable(Array.from({ length: 100 }, () => "\ud800"))).toHaveLength(10);
});

it("lets through every text without control characters, and none with a NUL", () => {
  const printable = fc.string({ unit: "grapheme", maxLength: 100 }).filter((text) => !/\p{Cc}/u.test(text));
  fc.assert(fc.property(printable, (text) => unstorable({ [text]: [text] }).length === 0));
  fc.assert(fc.property(printable, printable, (before, after) => unstorable([`${before}\u0000${after}`]).length === 1));
});
