import type { LengthUnit } from "@/bending/core/units";
import type { FlatPattern } from "@/bending/part/flatPattern";
import type { PartModel } from "@/bending/part/partModel";
import { formatLength } from "@/lib/format/formatLength";
import { formatMass } from "@/lib/format/formatMass";
import type { DocumentChange } from "./documentChanges";

export interface BuiltPart { readonly part: PartModel; readonly flat: FlatPattern }

/** What follows from the documents and is not the same: blank, mass, and each bend's deduction with its radius. */
export function resultChanges(older: BuiltPart, newer: BuiltPart, units: LengthUnit): readonly DocumentChange[] {
  const length = (value: number | undefined) => (value === undefined ? null : formatLength(value, units));
  const bends = [...new Set([...older.part.bends, ...newer.part.bends].map(({ id }) => id))].flatMap((id) => {
    const find = ({ part }: BuiltPart) => part.bends.find((bend) => bend.id === id);
    const [was, is] = [find(older), find(newer)];
    return [
      { name: `Bend ${id}, deduction`, before: length(was?.deduction), after: length(is?.deduction) },
      { name: `Bend ${id}, inside radius`, before: length(was?.insideRadius), after: length(is?.insideRadius) },
    ];
  });
  return [
    { name: "Blank, along x", before: length(older.flat.width), after: length(newer.flat.width) },
    { name: "Blank, along y", before: length(older.flat.depth), after: length(newer.flat.depth) },
    { name: "Mass", before: formatMass(older.flat.massKg), after: formatMass(newer.flat.massKg) },
    { name: "Bends", before: String(older.part.bends.length), after: String(newer.part.bends.length) },
    ...bends,
  ].filter(({ before, after }) => before !== after).map((change) => ({ ...change, key: change.name }));
}
