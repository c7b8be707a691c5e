import { readFileSync } from "node:fs";
import { join } from "node:path";
import { describe, expect, test } from "vitest";
import { HSE_GUIDE_KG, LOAD_CONSTANT_KG } from "@/bending";
import { buildSheetView } from "@/lib/sheet/buildSheetView";
import { channelPlan } from "@/lib/sheet/fixtures/channelPlan";

type Marked = { readonly mark: "V" | "M" | "C" };
interface Rule extends Marked {
  readonly rule: string;
  readonly clause: string;
  /** Words of the sheet that say it. */
  readonly says?: readonly string[];
  /** What a sheet that is silent on it must not contain, and why it is silent. */
  readonly silent?: string;
  readonly why?: string;
}
interface Distance extends Marked { readonly form: string; readonly time: number; readonly expected: number; readonly source: string }
interface Form { readonly factor: number; readonly upTo?: number }

const read = <T>(...path: string[]) => JSON.parse(readFileSync(join(import.meta.dirname, "handbook", ...path), "utf8")) as T;
const { rules } = read<{ readonly rules: readonly Rule[] }>("safety", "rules.json");
const { forms, cases } = read<{ readonly forms: Readonly<Record<string, Form>>; readonly cases: readonly Distance[] }>("safety", "distances.json");

/** The cautions of a sheet whose blank weighs so much. */
function cautions(massKg: number): readonly string[] {
  const plan = { ...channelPlan.plan, flat: { ...channelPlan.plan.flat, massKg } };
  return buildSheetView({ ...channelPlan, plan, part: { number: "RS-104", name: "Channel", revision: 3 }, sheet: { number: "S-0007" } }).cautions.map(({ text }) => text);
}
const TWO_SQUARE_METRES_OF_2_MM_STEEL_KG = 31.4;
const heavy = cautions(TWO_SQUARE_METRES_OF_2_MM_STEEL_KG).join("\n");

describe("what a setup sheet warns of", () => {
  test.each(rules.filter(({ says }) => says))("[$mark] $rule", ({ says = [], clause }) => {
    expect(clause).not.toBe("");
    for (const words of says) expect(heavy).toContain(words);
  });

  test.each(rules.filter(({ says }) => !says))("[$mark] silent on: $rule", ({ silent, why, clause }) => {
    expect([clause, why]).not.toContain("");
    expect(why).toBeDefined();
    expect(heavy).not.toMatch(new RegExp(silent ?? ".", "i"));
  });

  test("two people are asked for well under every published limit for one", () => {
    const asked = (kg: number) => cautions(kg).some((text) => text.includes("two people"));
    expect([asked(1), asked(TWO_SQUARE_METRES_OF_2_MM_STEEL_KG)]).toEqual([false, true]);
    for (const published of [LOAD_CONSTANT_KG, HSE_GUIDE_KG.men, HSE_GUIDE_KG.women]) expect([published, asked(published)]).toEqual([published, true]);
  });
});

test.each(cases)("[$mark] $form: $time s is $expected, as published", ({ form, time, expected }) => {
  const { factor, upTo } = forms[form] ?? { factor: NaN };
  const exact = factor * time;
  expect(upTo === undefined ? exact : Math.ceil(exact / upTo) * upTo).toBeCloseTo(expected, 9);
});
