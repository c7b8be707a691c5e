import { describe, expect, it } from "vitest";
import { parseProfile } from "./parseProfile";

describe("parseProfile", () => {
  it("reads points by line and as a list", () => {
    const points = [[0, 0], [3.5, -4], [-2, 8]];
    expect(parseProfile("0 0\n3.5, -4\n\n-2;8")).toEqual({ ok: true, value: points });
    expect(parseProfile(JSON.stringify(points))).toEqual({ ok: true, value: points });
  });
  it.each([["", "one a line"], ["0 0\n1 two", "Line 2"], ["1 2 3", "Line 1"], ["[[1,2],[3]]", "pairs of numbers"], ["[[1,2", "cannot be read"]])("says what is wrong with %j", (text, part) => {
    const read = parseProfile(text);
    expect(read.ok ? "" : read.error).toContain(part);
  });
});
