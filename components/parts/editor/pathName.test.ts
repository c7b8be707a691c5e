import { expect, it } from "vitest";
import { startDraft } from "../draft/startDraft";
import { pathName } from "./pathName";

it("names a hole's fields as the form does", () => {
  const draft = startDraft("S235");
  expect(pathName("base.holes[0].circle[1]", draft)).toBe("Base, hole 1, y");
  expect(pathName("base.holes[1].diameter", draft)).toBe("Base, hole 2, diameter");
  expect(pathName("base.width", draft)).toBe("Base, width");
});
