import { expect, it } from "vitest";
import { convertLengthText } from "./convertLengthText";

it("converts what was typed and keeps what names its unit or cannot be read", () => {
  expect(convertLengthText("25.4", "mm", "in")).toBe("1");
  expect(convertLengthText("1 1/2", "in", "mm")).toBe("38.1");
  expect(convertLengthText("2 mm", "mm", "in")).toBe("2 mm");
  expect(convertLengthText("12..", "mm", "in")).toBe("12..");
  expect(convertLengthText("", "mm", "in")).toBe("");
});
