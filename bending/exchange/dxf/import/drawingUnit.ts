/** A unit that a drawing may be in. */
export type DrawingUnit = "mm" | "cm" | "m" | "in" | "ft";

export const mmPerDrawingUnit: Readonly<Record<DrawingUnit, number>> = { mm: 1, cm: 10, m: 1000, in: 25.4, ft: 304.8 };

/** As in "in mm", "in inches". */
export const drawingUnitName: Readonly<Record<DrawingUnit, string>> = { mm: "mm", cm: "cm", m: "metres", in: "inches", ft: "feet" };

/** Values of $INSUNITS (DXF reference, header variables). */
export const unitOfHeader: Readonly<Record<number, DrawingUnit>> = { 1: "in", 2: "ft", 4: "mm", 5: "cm", 6: "m" };
