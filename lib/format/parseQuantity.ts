import { create, parseDependencies, type MathNode } from "mathjs/number";
import { fail, ok, type Result } from "@/bending/core/result";
import type { LengthUnit } from "@/bending/core/units";
import type { MaterialGroup } from "@/bending/handbook/material";
import { evaluateQuantity, type Measured } from "./evaluateQuantity";
import { quantityKinds, type Dimension, type QuantityKind } from "./quantityKind";
import { quantityUnits } from "./quantityUnits";
import { spellExpression } from "./spellExpression";
import { spellGauges } from "./spellGauges";

/** The parser alone: nothing that evaluates, imports or makes units is in it. */
const grammar = create(parseDependencies ?? {});

export interface ParseQuantityOptions {
  /** The system whose usual unit a bare number is in. */
  readonly system: LengthUnit;
  /** Whose gauge numbers `16 ga` is read by; without it a gauge has to name its metal. */
  readonly gaugeGroup?: MaterialGroup | undefined;
}

/**
 * A quantity as people type it, in sums with units of either system: `3/32 in`, `16 ga`, `2*1.5 mm`, `1 1/2"`, `(40+2) mm`,
 * `60 deg`, `65 ksi`. Answers mm, degrees, MPa, kN, kg, kg/m³ or a plain number; else why not and what would be right, as an
 * end of a sentence that begins with the field's name. For the plain fields of other forms `parseLength` is enough and
 * carries no grammar: this file is to be loaded when it is needed (`await import`).
 */
export function parseQuantity(text: string, kind: QuantityKind, { system, gaugeGroup }: ParseQuantityOptions): Result<number, string> {
  const facts = quantityKinds[kind];
  const wanted = `Type ${facts.article}, e.g. ${facts.examples}.`;
  if (text.trim() === "") return fail(`is empty. ${wanted}`);
  const measured = measure(text, kind, gaugeGroup);
  if (!measured.ok) return fail(`${measured.error}. ${wanted}`);
  const { value, dimension } = measured.value;
  const scaled = sameDimension(dimension, facts.dimension) ? value / facts.kept
    : sameDimension(dimension, [0, 0, 0, 0]) ? (value * bareUnit(kind, system)) / facts.kept : null;
  if (scaled === null) return fail(`is ${dimensionName(dimension)}. ${wanted}`);
  if (kind === "count" && !Number.isInteger(cleared(scaled))) return fail(`is not whole. ${wanted}`);
  return ok(cleared(scaled));
}

function measure(text: string, kind: QuantityKind, gaugeGroup: MaterialGroup | undefined): Result<Measured, string> {
  const gauged = spellGauges(text, kind, gaugeGroup);
  const spelled = gauged.ok ? spellExpression(gauged.value, kind === "angle") : gauged;
  if (!spelled.ok) return spelled;
  const parsed = parse(spelled.value);
  return parsed.ok ? evaluateQuantity(parsed.value) : parsed;
}

/** The grammar throws on what it cannot read; its words would be about the spelled text, so they are not passed on. */
function parse(spelled: string): Result<MathNode, string> {
  try {
    return ok(grammar.parse(spelled));
  } catch {
    return fail("cannot be read as a number or a sum");
  }
}

/** A bare number's unit in mm, N, kg, degrees. */
function bareUnit(kind: QuantityKind, system: LengthUnit): number {
  if (kind === "density") return system === "in" ? (quantityUnits.get("lb")?.scale ?? 1) / 25.4 ** 3 : 1e-9;
  return quantityUnits.get(quantityKinds[kind].unit[system].replace("°", "deg").toLowerCase())?.scale ?? 1;
}

const sameDimension = (a: Dimension, b: Dimension): boolean => a.every((exponent, i) => exponent === b[i]);

const others: readonly (readonly [Dimension, string])[] = [[[2, 0, 0, 0], "an area"], [[3, 0, 0, 0], "a volume"], [[1, 1, 0, 0], "a torque or a work"]];

function dimensionName(dimension: Dimension): string {
  const kinds = Object.values(quantityKinds).map((facts) => [facts.dimension, facts.article] as const);
  return [...kinds, ...others].find(([known]) => sameDimension(known, dimension))?.[1] ?? "not one unit when worked out";
}

/** Takes the noise of conversion off the last digits, far under anything that can be measured. */
const cleared = (value: number): number => Number(value.toPrecision(12));
