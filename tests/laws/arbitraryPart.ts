import fc from "fast-check";
import type { FlangeEntry, PartDocument, ProfileBend } from "@/bending";

const angle = fc.oneof(fc.constant(90), fc.constant(180), fc.integer({ min: 5, max: 179 }));
const direction = fc.constantFrom("up" as const, "down" as const);
const common = fc.record({
  thickness: fc.constantFrom(0.5, 1, 1.5, 2, 3),
  insideRadius: fc.constantFrom(0.5, 1, 2, 4),
  material: fc.constantFrom("S235", "1.4301", "AW-5754-H22"),
});

/** Profiles of up to six legs, long enough for their bends. */
export const arbitraryProfile: fc.Arbitrary<PartDocument> = fc.record({
  common,
  width: fc.integer({ min: 20, max: 600 }),
  first: fc.integer({ min: 20, max: 120 }),
  rest: fc.array(fc.record({ leg: fc.integer({ min: 20, max: 120 }), angle, direction }), { minLength: 1, maxLength: 5 }),
}).map(({ common: facts, width, first, rest }): PartDocument => ({
  format: "part/1", name: "profile", units: "mm", ...facts,
  profile: { width, legs: [first, ...rest.map(({ leg }) => leg)], bends: rest.map((entry): ProfileBend => ({ angle: entry.angle, direction: entry.direction })) },
}));

const side = fc.record({
  length: fc.integer({ min: 16, max: 50 }),
  angle: fc.integer({ min: 10, max: 120 }),
  direction,
  insets: fc.tuple(fc.integer({ min: 0, max: 20 }), fc.integer({ min: 0, max: 20 })),
  back: fc.option(fc.record({ length: fc.integer({ min: 14, max: 20 }), angle: fc.integer({ min: 10, max: 90 }), direction }), { nil: null }),
});

/** Rectangular bases with flanges on some edges, some with a return. */
export const arbitraryTray: fc.Arbitrary<PartDocument> = fc.record({
  common,
  width: fc.integer({ min: 80, max: 300 }),
  depth: fc.integer({ min: 80, max: 300 }),
  sides: fc.tuple(...[0, 1, 2, 3].map(() => fc.option(side, { nil: null }))),
}).map(({ common: facts, width, depth, sides }): PartDocument => ({
  format: "part/1", name: "tray", units: "mm", ...facts,
  base: { outline: [[0, 0], [width, 0], [width, depth], [0, depth]], holes: [{ circle: [width / 2, depth / 2], diameter: 20 }] },
  flanges: sides.flatMap((entry, edge): readonly FlangeEntry[] => {
    if (!entry) return [];
    const { length, angle: turned, direction: way, insets, back } = entry;
    const flange: FlangeEntry = { id: `side${edge}`, on: "base", edge, length, angle: turned, direction: way, start: insets[0], end: insets[1] };
    return back ? [flange, { id: `back${edge}`, on: `side${edge}`, edge: 2, ...back }] : [flange];
  }),
}));
