import fc from "fast-check";
import { evaluate } from "mathjs/number";
import { describe, expect, it } from "vitest";
import { defaultMethodFactors } from "@/bending/handbook/forceMethods";
import { builtInMaterials } from "@/bending/handbook/materials";
import type { LengthUnit } from "@/bending/core/units";
import { parseQuantity } from "@/lib/format/parseQuantity";
import type { Answer, Formula } from "./answer";
import { askQuestion } from "./askQuestion";
import { calculatorChoices, type Choices } from "./choices";
import { fieldKeys, type FieldKey } from "./fields";
import { formulaText } from "./formulaText";
import { readFields, type FieldTexts } from "./readFields";
import { sections } from "./sections";
import { splitFormula, type FormulaPart } from "./splitFormula";

const degrees = (f: (x: number) => number) => (x: number) => f((x * Math.PI) / 180);
const scope = { tan: degrees(Math.tan), cos: degrees(Math.cos), pi: Math.PI };

const firstChoices = Object.fromEntries(Object.entries(calculatorChoices).map(([key, [first]]) => [key, first])) as unknown as Choices;
const steel = builtInMaterials.find(({ id }) => id === "S235") ?? builtInMaterials[0]!;

function answersTo(texts: FieldTexts, choices: Choices = firstChoices, material = steel): readonly Answer[] {
  const read = readFields(texts, parseQuantity, choices.u, material.group);
  expect(read.problems).toEqual({});
  const question = askQuestion(read, choices, material, defaultMethodFactors);
  return sections.flatMap((section) => section.answer(question)).flatMap(({ answers }) => answers);
}

/** The formula's right side worked out with its own numbers by another program's arithmetic. */
function workedOut({ text, of }: Formula): number {
  const spell = (parts: readonly FormulaPart[]): string => parts.map((part) =>
    part.kind === "text" ? part.text : part.kind === "name" ? `(${of[part.name]?.value ?? NaN})` : `((${spell(part.above)}) / (${spell(part.below)}))`).join("");
  const right = spell(splitFormula(text.slice(text.indexOf(" = ") + 3), Object.keys(of)));
  const plain = right.replaceAll("·", "*").replaceAll("−", "-").replaceAll("²", "^2").replaceAll("³", "^3").replaceAll("π", "pi").replaceAll("°", "");
  return Number(evaluate(plain, { ...scope }));
}

/** Equal up to the power of ten that lies between N and kN, mm³ and m³. */
function sameDigits(a: number, b: number): boolean {
  if (Math.abs(a - b) < 1e-7) return true;
  const power = Math.log10(a / b);
  return Math.abs(power - Math.round(power)) < 1e-7 && Math.abs(power) < 10;
}

const between = (min: number, max: number) => fc.integer({ min: Math.round(min * 1000), max: Math.round(max * 1000) }).map((n) => n / 1000);
const entries = fc.record({ t: between(0.3, 20), a: between(1, 169), v: between(2, 200), r: between(0.1, 40), l: between(10, 4000), sh: between(0, 5), da: between(30, 120), hg: between(0, 4), sl: between(1, 80) });
const choices = fc.record(Object.fromEntries(Object.entries(calculatorChoices).map(([key, values]) => [key, fc.constantFrom(...values)]))) as unknown as fc.Arbitrary<Choices>;
const textsOf = (numbers: Readonly<Record<string, number>>, unit: LengthUnit): FieldTexts =>
  Object.fromEntries(Object.entries(numbers).map(([key, value]) => [key, key === "a" || key === "da" ? String(value) : unit === "mm" ? `${value} mm` : `${value}/25.4 in`]));

describe("the calculator's sections", () => {
  it("shows only formulas that give the number beside them", () => {
    fc.assert(fc.property(entries, choices, fc.constantFrom(...builtInMaterials), (numbers, chosen, material) => {
      for (const { label, value, formula } of answersTo(textsOf(numbers, "mm"), chosen, material)) {
        if (formula === undefined) continue;
        const found = workedOut(formula);
        expect(sameDigits(found, value), `${label}: ${formulaText(formula, null)} is ${found}, said to be ${value}`).toBe(true);
      }
    }), { numRuns: 60 });
  });

  it("gives finite answers with a source for what stands there at first, for every material", () => {
    for (const material of builtInMaterials) {
      for (const answer of answersTo({}, firstChoices, material)) {
        expect(Number.isFinite(answer.value), answer.label).toBe(true);
        expect(answer.source).not.toBe("");
      }
    }
  });

  it("answers inches as it answers the same millimetres", () => {
    fc.assert(fc.property(entries, (numbers) => {
      const [metric, inch] = [answersTo(textsOf(numbers, "mm")), answersTo(textsOf(numbers, "in"), { ...firstChoices, u: "in" })];
      expect(inch.map(({ value }) => value.toPrecision(8))).toEqual(metric.map(({ value }) => value.toPrecision(8)));
    }), { numRuns: 20 });
  });

  it("has no two sections of one name, and every field in one", () => {
    expect(new Set(sections.map(({ id }) => id)).size).toBe(sections.length);
    const asked = new Set<FieldKey>(sections.flatMap(({ fields, needs }) => [...fields, ...needs]));
    expect(fieldKeys.filter((key) => !asked.has(key))).toEqual([]);
  });

  it("names the field, its bound and what was read", () => {
    const read = readFields({ t: "300 mm", a: "0", l: "abc", n: "2.5" }, parseQuantity, "mm", "steel");
    expect(read.problems.t).toBe("Thickness must be at most 100 mm; 300 mm was read.");
    expect(read.problems.a).toContain("Bend angle, turned through must be over 0°");
    expect(read.problems.l).toContain("Length of the bend has \"abc\"");
    expect(read.problems.n).toContain("Equal bends is not whole");
  });
});

it("writes a formula on one line, with names and with numbers", () => {
  const formula: Formula = { text: "K = [BA · 180° / (π · α) − R | t]", of: { BA: { value: 3.122, kind: "length" }, α: { value: 90, kind: "angle" }, R: { value: 1.5, kind: "length" }, t: { value: 1.5, kind: "length" } } };
  expect(formulaText(formula, null)).toBe("K = (BA · 180° / (π · α) − R) / t");
  expect(formulaText(formula, "mm")).toBe("K = (3.122 mm · 180° / (π · 90°) − 1.5 mm) / (1.5 mm)");
  expect(formulaText(formula, "in")).toContain("0.0591 in");
  expect(formulaText({ text: "A = t² · n", of: { t: { value: 2, kind: "length" }, n: { value: 3, kind: "count" } } }, "mm")).toBe("A = (2 mm)² · 3");
});
