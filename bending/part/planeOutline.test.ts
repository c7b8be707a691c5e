import fc from "fast-check";
import { expect, test } from "vitest";
import { signedArea } from "../geometry/signedArea";
import type { Vec2 } from "../geometry/vec2";
import { cutEnds } from "./cutEnds";
import { planeByClipping } from "./planeByClipping";
import { planeByWalking } from "./planeByWalking";
import { planeOutline } from "./planeOutline";

const square: readonly Vec2[] = [[0, 0], [100, 0], [100, 100], [0, 100]];
const bottom = { from: [0, 0], to: [100, 0] } as const;
const right = { from: [100, 0], to: [100, 100] } as const;
const top = { from: [100, 100], to: [0, 100] } as const;
const face = (points: readonly Vec2[]) => ({ points, edges: [], circles: [], chainEdge: null, dimension: "outside" as const });

const cut = fc.record({
  depth: fc.integer({ min: 1, max: 8 }),
  start: fc.integer({ min: 0, max: 40 }),
  end: fc.integer({ min: 0, max: 40 }),
  relief: fc.option(fc.record({ kind: fc.constantFrom("rectangular" as const, "tear" as const, "round" as const), width: fc.integer({ min: 1, max: 5 }), depth: fc.integer({ min: 1, max: 20 }) }), { nil: null }),
});

test("walking round the outline and the general polygon clip cut the same", () => {
  let walked = 0;
  fc.assert(fc.property(cut, cut, fc.boolean(), (a, b, opposite) => {
    const ends = cutEnds(face(square), [{ edge: bottom, ...a }, { edge: opposite ? top : right, ...b }]);
    const [quick, general] = [planeByWalking(face(square), ends), planeByClipping(face(square), ends)];
    if (quick) walked++;
    // Where walking gives up, the clip answers; where it answers, both say the same.
    if (quick) expect(signedArea(quick)).toBeCloseTo(signedArea(general ?? []), 6);
  }), { numRuns: 80 });
  expect(walked).toBeGreaterThan(40);
});

test("a round relief takes a half round at its end", () => {
  const plane = planeOutline(face(square), [{ edge: bottom, depth: 3, start: 30, end: 30, relief: { kind: "round", width: 4, depth: 6 } }]);
  const half = (Math.PI * 4) / 2;
  // The strip of 40 x 3, and two notches of width 4: 4 straight and a half round of radius 2.
  expect(100 * 100 - signedArea(plane ?? [])).toBeCloseTo(40 * 3 + 2 * (4 * 4 + half), 0);
});

test("cuts that leave nothing, or more than one piece, leave no plane", () => {
  expect(planeOutline(face(square), [{ edge: bottom, depth: 60, start: 0, end: 0, relief: null }, { edge: top, depth: 60, start: 0, end: 0, relief: null }])).toBeNull();
  expect(planeOutline(face(square), [{ edge: bottom, depth: 60, start: 40, end: 40, relief: null }, { edge: top, depth: 60, start: 40, end: 40, relief: null }])).toBeNull();
});
