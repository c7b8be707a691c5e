import fc from "fast-check";
import { buildPart, materialById, type DocumentVertex, type FlangeEntry, type PartDocument } from "@/bending";

const direction = fc.constantFrom("up" as const, "down" as const);
const further = (length: number) => fc.option(fc.record({ length: fc.integer({ min: length, max: length + 8 }), angle: fc.integer({ min: 20, max: 100 }), direction }), { nil: null });
const side = fc.record({
  length: fc.integer({ min: 24, max: 45 }),
  angle: fc.integer({ min: 20, max: 110 }),
  inset: fc.option(fc.integer({ min: 12, max: 20 }), { nil: null }),
  hole: fc.constantFrom("none", "plane", "across"),
  second: further(16),
  third: further(14),
});

const buildable = (document: PartDocument) => buildPart(document, { materials: materialById }).ok;

/** Polygon bases of four to eight edges with flanges on some of them, flanges on those, mitres, reliefs, holes in faces and across bends. Those whose flats overlap are left out. */
export const arbitraryTree: fc.Arbitrary<PartDocument> = fc.record({
  corners: fc.integer({ min: 4, max: 8 }),
  stretch: fc.integer({ min: 80, max: 130 }),
  turn: fc.integer({ min: 0, max: 359 }),
  thickness: fc.constantFrom(0.8, 1, 1.5),
  insideRadius: fc.constantFrom(0.5, 1, 2),
  way: direction,
  corner: fc.constantFrom({ kind: "open" as const }, { kind: "mitre" as const, gap: 0.4 }, { kind: "mitre" as const, gap: 3 }),
  relief: fc.constantFrom({ kind: "rectangular" as const }, { kind: "round" as const, width: 3 }),
  sides: fc.array(fc.option(side, { nil: null }), { minLength: 8, maxLength: 8 }),
}).map(({ corners, stretch, turn, thickness, insideRadius, way, corner, relief, sides }): PartDocument => ({
  format: "part/1", name: "tree", units: "mm", material: "S235", thickness, insideRadius, corner, relief,
  base: { outline: Array.from({ length: corners }, (_, i): DocumentVertex => {
    const a = ((turn + (360 * i) / corners) * Math.PI) / 180;
    return [1.3 * stretch * Math.cos(a), 1.3 * stretch * Math.sin(a)];
  }), holes: [{ circle: [3, 5], diameter: 20 }] },
  flanges: sides.slice(0, corners).flatMap((entry, edge): readonly FlangeEntry[] => {
    if (!entry) return [];
    const { length, angle, inset, hole, second, third } = entry;
    const id = `side${edge}`;
    const hung = second ? [{ id: `${id}b`, on: id, edge: 2, ...second }, ...(third ? [{ id: `${id}c`, on: `${id}b`, edge: 2, ...third }] : [])] : [];
    const holes: FlangeEntry["holes"] = hole === "none" ? [] : [{ circle: [25, hole === "plane" ? 13 : 1], diameter: 6 }];
    return [{ id, on: "base", edge, length, angle, direction: way, holes, ...(inset === null ? {} : { start: inset, end: inset }) }, ...hung];
  }),
})).filter(buildable);
