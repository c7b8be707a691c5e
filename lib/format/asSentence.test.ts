import { expect, it } from "vitest";
import { asSentence } from "./asSentence";

it("makes a message a sentence and leaves names as they are written", () => {
  expect(asSentence("bend b1 is tight")).toBe("Bend b1 is tight.");
  expect(asSentence("b3 with P88: it collides", ["b3"])).toBe("b3 with P88: it collides.");
  expect(asSentence("Is it so?")).toBe("Is it so?");
});
