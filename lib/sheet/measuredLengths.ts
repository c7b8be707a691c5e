import type { PartDocument } from "@/bending/part/partDocument";

export interface MeasuredLength {
  readonly what: string;
  /** In the document's units. */
  readonly length: number;
  readonly tolerance: number | null;
  /** The face whose length it is; null for the width, which bending does not change. */
  readonly face: string | null;
}

/** The lengths that a document states and a caliper can take: legs of a profile, lengths of flanges. A flat as drawn states none. */
export function measuredLengths(document: PartDocument): readonly MeasuredLength[] {
  const kind = document.dimension ?? "outside";
  if (document.profile) {
    const { legs, width } = document.profile;
    return [
      ...legs.map((length, i) => ({ what: `Leg ${i === 0 ? "base" : `b${i}`}, ${legKind(kind, i, legs.length)}`, length, tolerance: null, face: i === 0 ? "base" : `b${i}` })),
      { what: "Width along the bends", length: width, tolerance: null, face: null },
    ];
  }
  return (document.flanges ?? []).flatMap((flange) =>
    flange.length === undefined
      ? []
      : [{ what: `Flange ${flange.id}, ${flange.dimension ?? kind}`, length: flange.length, tolerance: flange.toleranceLength ?? null, face: flange.id }],
  );
}

/** A leg between two bends is always measured outside to outside. */
const legKind = (kind: string, index: number, count: number): string => (index === 0 || index === count - 1 ? kind : "outside");
