import { ok, type Result } from "@/bending/core/result";
import type { LengthUnit } from "@/bending/core/units";
import type { MaterialGroup } from "@/bending/handbook/material";
import { formatQuantity } from "@/lib/format/formatQuantity";
import type { ParseQuantityOptions } from "@/lib/format/parseQuantity";
import { quantityKinds, type QuantityKind } from "@/lib/format/quantityKind";
import { fieldKeys, fieldOf, type CalculatorField, type FieldKey } from "./fields";

export type ParseQuantity = (text: string, kind: QuantityKind, options: ParseQuantityOptions) => Result<number, string>;
export type FieldTexts = Readonly<Partial<Record<FieldKey, string>>>;

export interface ReadFields {
  /** Null: left empty, and the field says what is taken then. Not there: not readable. */
  readonly values: Readonly<Partial<Record<FieldKey, number | null>>>;
  /** Sentences that begin with the field's name. */
  readonly problems: Readonly<Partial<Record<FieldKey, string>>>;
}

/** Every field's text as a number in mm, degrees, MPa, or what is wrong with it. */
export function readFields(texts: FieldTexts, parse: ParseQuantity, system: LengthUnit, gaugeGroup: MaterialGroup): ReadFields {
  const values: Partial<Record<FieldKey, number | null>> = {};
  const problems: Partial<Record<FieldKey, string>> = {};
  for (const key of fieldKeys) {
    const field = fieldOf(key);
    const text = texts[key] ?? field.start;
    if (text.trim() === "" && field.empty !== undefined) { values[key] = null; continue; }
    const read = parse(text, field.kind, { system, gaugeGroup: key === "t" ? gaugeGroup : undefined });
    const held = read.ok ? within(read.value, field, system) : read;
    if (held.ok) values[key] = held.value;
    else problems[key] = `${field.label} ${held.error}`;
  }
  return { values, problems };
}

function within(value: number, field: CalculatorField, system: LengthUnit): Result<number, string> {
  const said = (bound: number) => (field.kind === "ratio" || field.kind === "count" ? String(bound) : field.kind === "force" ? `${bound} kN` : formatQuantity(bound, field.kind, system));
  const lowest = field.over !== undefined ? `over ${said(field.over)}` : `${said(field.least ?? 0)} or more`;
  if ((field.over !== undefined && value <= field.over) || (field.least !== undefined && value < field.least)) return { ok: false, error: `must be ${lowest}; ${said(value)} was read. Type ${quantityKinds[field.kind].article} of up to ${said(field.most)}.` };
  return value > field.most ? { ok: false, error: `must be at most ${said(field.most)}; ${said(value)} was read.` } : ok(value);
}
