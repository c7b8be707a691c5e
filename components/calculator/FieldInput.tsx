import type { LengthUnit } from "@/bending/core/units";
import { NumberInput } from "@/components/ui/NumberInput";
import { fieldOf, type FieldKey } from "@/lib/calculator/fields";
import { namesUnit } from "@/lib/calculator/namesUnit";
import { formatQuantity } from "@/lib/format/formatQuantity";
import { quantityKinds } from "@/lib/format/quantityKind";

export interface FieldInputProps {
  readonly place: string;
  readonly name: FieldKey;
  readonly text: string;
  readonly units: LengthUnit;
  /** As read; null: left empty; undefined: not readable. */
  readonly value: number | null | undefined;
  readonly problem: string | undefined;
  /** What is taken when it is left empty. */
  readonly taken?: string | undefined;
  readonly gauge?: string | undefined;
  readonly onText: (text: string) => void;
}

/** A field that takes sums with units and says how it has read them, in both systems. */
export function FieldInput({ place, name, text, units, value, problem, taken, gauge, onText }: FieldInputProps) {
  const { label, kind, empty } = fieldOf(name);
  const hint = value === null ? <>Empty: {empty}{taken === undefined ? "" : `, ${taken}`}</> : value === undefined ? undefined : readBack(value);
  function readBack(read: number) {
    if (kind === "ratio" || kind === "count" || kind === "force" || (kind === "angle" && /^\s*[\d.]+\s*°?\s*$/.test(text))) return undefined;
    const [here, there] = [formatQuantity(read, kind, units), formatQuantity(read, kind, units === "mm" ? "in" : "mm")];
    return <span className="num">= {here}{there === here ? "" : ` · ${there}`}{gauge !== undefined && /g(a|auge|age)\b/i.test(text) ? <span className="font-sans"> ({gauge} gauge)</span> : null}</span>;
  }
  return (
    <NumberInput id={`${place}-${name}`} label={label} unit={namesUnit(text) ? "" : quantityKinds[kind].unit[units]} value={text} onChange={(event) => onText(event.target.value)} maxLength={120}
      {...(hint === undefined ? {} : { hint })} error={problem} />
  );
}
