import { calculatorChoices, choiceKeys, type ChoiceKey, type Choices } from "./choices";
import { fieldKeys, fieldOf } from "./fields";
import type { FieldTexts } from "./readFields";

/** What has been entered, as typed. */
export interface CalculatorState {
  readonly texts: FieldTexts;
  readonly choices: Choices;
  /** Short name of the material; empty: the first of the list. */
  readonly material: string;
}

const LONGEST = 120;
const oneOf = <Key extends ChoiceKey>(key: Key, value: string | null): Choices[Key] => {
  const values: readonly string[] = calculatorChoices[key];
  return (values.find((one) => one === value) ?? values[0]) as Choices[Key];
};

/** Reads the query of an address; what is not known is left out. */
export function readState(query: string): CalculatorState {
  const params = new URLSearchParams(query);
  return {
    texts: Object.fromEntries(fieldKeys.flatMap((key) => { const text = params.get(key); return text === null ? [] : [[key, text.slice(0, LONGEST)]]; })),
    choices: {
      u: oneOf("u", params.get("u")), rule: oneOf("rule", params.get("rule")), vm: oneOf("vm", params.get("vm")), grain: oneOf("grain", params.get("grain")),
      temper: oneOf("temper", params.get("temper")), family: oneOf("family", params.get("family")), kr: oneOf("kr", params.get("kr")), hole: oneOf("hole", params.get("hole")),
    },
    material: (params.get("m") ?? "").slice(0, LONGEST),
  };
}

/** The query that `readState` reads back: only what differs from how the calculator starts. */
export function writeState({ texts, choices, material }: CalculatorState): string {
  const params = new URLSearchParams();
  if (material !== "") params.set("m", material);
  for (const key of choiceKeys) if (choices[key] !== calculatorChoices[key][0]) params.set(key, choices[key]);
  for (const key of fieldKeys) {
    const text = texts[key];
    if (text !== undefined && text !== fieldOf(key).start) params.set(key, text);
  }
  return params.toString();
}
