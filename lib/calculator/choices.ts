import { aluminiumRadii } from "@/bending/handbook/aluminiumMinimumRadius";
import { softHardRadii } from "@/bending/handbook/softHardRadius";
import { springbackTable } from "@/bending/handbook/springbackFactor";

const keysOf = <Key extends string>(table: Readonly<Record<Key, unknown>>) => Object.keys(table) as Key[];

/** What is chosen from a list, by its name in the page's address; the first of each is where it starts. */
export const calculatorChoices = {
  u: ["mm", "in"],
  rule: ["material", "din6935", "machinery", "faa", "k"],
  vm: ["between-tops", "between-corners"],
  grain: ["across", "along"],
  temper: keysOf(aluminiumRadii),
  family: keysOf(softHardRadii),
  kr: keysOf(springbackTable),
  hole: ["round", "slot", "countersink", "counterbore"],
} as const satisfies Readonly<Record<string, readonly string[]>>;

export type ChoiceKey = keyof typeof calculatorChoices;
export type Choices = { readonly [Key in ChoiceKey]: (typeof calculatorChoices)[Key][number] };
export const choiceKeys = Object.keys(calculatorChoices) as readonly ChoiceKey[];
