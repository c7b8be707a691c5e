import fc from "fast-check";
import { expect, it } from "vitest";
import { calculatorChoices, type Choices } from "./choices";
import { fieldKeys } from "./fields";
import { readState, writeState } from "./stateInAddress";

const choices = fc.record(Object.fromEntries(Object.entries(calculatorChoices).map(([key, values]) => [key, fc.constantFrom(...values)]))) as unknown as fc.Arbitrary<Choices>;
const texts = fc.dictionary(fc.constantFrom(...fieldKeys), fc.string({ maxLength: 40 }));

it("keeps whatever was typed and chosen in the address", () => {
  fc.assert(fc.property(texts, choices, fc.string({ maxLength: 20 }), (typed, chosen, material) => {
    const again = readState(writeState({ texts: typed, choices: chosen, material }));
    expect(writeState(again)).toBe(writeState({ texts: typed, choices: chosen, material }));
    expect(again.choices).toEqual(chosen);
  }));
});

it("passes over what it does not know", () => {
  expect(readState("u=furlong&x=1&t=3%20mm")).toMatchObject({ choices: { u: "mm" }, texts: { t: "3 mm" } });
});
