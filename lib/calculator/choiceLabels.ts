import { calculatorChoices, type ChoiceKey } from "./choices";

export const choiceTitles: Readonly<Record<ChoiceKey, string>> = {
  u: "Units", rule: "Rule that goes first", vm: "The V is measured", grain: "Bend line to the rolling direction", temper: "Alloy and temper", family: "Family of metal", kr: "Row of the k_R table", hole: "What is pierced",
};

const words: Readonly<Record<string, string>> = {
  in: "inch", material: "the material's own", din6935: "DIN 6935", machinery: "Straight length", faa: "FAA", k: "K by hand",
  "between-tops": "between the arc tops", "between-corners": "between sharp corners",
};

/** The values of a choice with their words. */
export const choiceOptions = (key: ChoiceKey): readonly { readonly value: string; readonly label: string }[] =>
  calculatorChoices[key].map((value: string) => ({ value, label: words[value] ?? value }));
