import type { Deg, Mm, MPa, Rad } from "@/bending/core/units";
import type { DieOpening } from "@/bending/handbook/dieOpening";
import type { MethodFactors } from "@/bending/handbook/forceMethods";
import type { MaterialFacts } from "@/bending/handbook/material";
import type { ShopTable } from "@/bending/shopTable/shopCell";
import type { Choices } from "./choices";
import type { FieldKey } from "./fields";

/** Everything that was entered, read: what the sections answer from. A field with a mistake has no number. */
export interface Question {
  readonly choices: Choices;
  /** With the strengths that were typed in place of its own. */
  readonly material: MaterialFacts;
  readonly factors: MethodFactors;
  /** The shop's measured bends of the material; null where they may not be read or are not there yet. */
  readonly shopTable: ShopTable | null;
  readonly tensile: MPa;
  readonly thickness: Mm;
  readonly angle: Rad;
  readonly degrees: Deg;
  readonly vOpening: Mm;
  readonly insideRadius: Mm;
  readonly die: DieOpening;
  /** The number of a section's own field; sections are asked only when all their fields have one. */
  readonly number: (key: FieldKey) => number;
}
