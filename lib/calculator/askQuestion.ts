import { deg, mm, mpa, toRad } from "@/bending/core/units";
import type { MethodFactors } from "@/bending/handbook/forceMethods";
import type { MaterialFacts } from "@/bending/handbook/material";
import { naturalRadius } from "@/bending/handbook/naturalRadius";
import { vOpeningRule } from "@/bending/handbook/vOpeningRule";
import type { ShopTable } from "@/bending/shopTable/shopCell";
import type { Choices } from "./choices";
import type { FieldKey } from "./fields";
import type { Question } from "./question";
import { readDie } from "./readDie";
import type { ReadFields } from "./readFields";

/** What was read, with the usual V, the natural radius and the material's own strengths where a field was left empty. */
export function askQuestion({ values }: ReadFields, choices: Choices, material: MaterialFacts, factors: MethodFactors, shopTable: ShopTable | null = null): Question {
  const number = (key: FieldKey): number => values[key] ?? NaN;
  const thickness = mm(number("t"));
  const degrees = deg(number("a"));
  const vOpening = mm(values.v ?? vOpeningRule(thickness));
  const strong = { ...material, yield: mpa(values.re ?? material.yield) };
  return {
    choices, shopTable, material: strong, thickness, degrees, vOpening, number,
    tensile: mpa(values.rm ?? material.tensile[1]),
    factors: { air: 1, bottoming: values.fb ?? factors.bottoming, coining: values.fc ?? factors.coining },
    angle: toRad(degrees),
    insideRadius: mm(values.r ?? naturalRadius(material, vOpening)),
    die: readDie(choices.vm, vOpening, number),
  };
}
