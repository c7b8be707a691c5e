import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { applyFrame } from "./applyFrame";
import { arcToChords } from "./arcToChords";
import { circleToChords } from "./circleToChords";
import { cleanPolygon } from "./cleanPolygon";
import { composeFrames } from "./composeFrames";
import { convexOverlap } from "./convexOverlap";
import { convexPieces } from "./convexPieces";
import type { Frame } from "./frame";
import { freeIntervals } from "./freeIntervals";
import { intersectIntervals } from "./intersectIntervals";
import type { Interval } from "./interval";
import { invertFrame } from "./invertFrame";
import { longestFreeInterval } from "./longestFreeInterval";
import { mergeIntervals } from "./mergeIntervals";
import { polygonCentroid } from "./polygonCentroid";
import { polygonContains } from "./polygonContains";
import { segmentsCross } from "./segmentsCross";
import { selfCrossing } from "./selfCrossing";
import { signedArea } from "./signedArea";
import type { Vec2 } from "./vec2";
import type { Vec3 } from "./vec3";

const coordinate = fc.double({ min: -200, max: 200, noNaN: true });
const point3 = fc.tuple(coordinate, coordinate, coordinate);

/** A rigid frame out of three angles and a place. */
const frame = fc.tuple(fc.double({ min: -3, max: 3, noNaN: true }), fc.double({ min: -3, max: 3, noNaN: true }), fc.double({ min: -3, max: 3, noNaN: true }), point3).map(([a, b, c, o]): Frame => {
  const [ca, sa, cb, sb, cc, sc] = [Math.cos(a), Math.sin(a), Math.cos(b), Math.sin(b), Math.cos(c), Math.sin(c)];
  return { x: [ca * cb, sa * cb, -sb], y: [ca * sb * sc - sa * cc, sa * sb * sc + ca * cc, cb * sc], z: [ca * sb * cc + sa * sc, sa * sb * cc - ca * sc, cb * cc], o };
});

/** A star round the origin: simple, counter-clockwise, mostly not convex. */
const star = fc.array(fc.tuple(fc.integer({ min: 1, max: 20 }), fc.integer({ min: 5, max: 100 })), { minLength: 3, maxLength: 16 }).map((rays): readonly Vec2[] => {
  const whole = rays.reduce((sum, [step]) => sum + step, 0);
  let turned = 0;
  return rays.map(([step, length]): Vec2 => {
    turned += step;
    return [length * Math.cos((2 * Math.PI * turned) / whole), length * Math.sin((2 * Math.PI * turned) / whole)];
  });
}).filter((polygon) => polygon.every((p, i) => {
  const q = polygon[(i + 1) % polygon.length] ?? p;
  return p[0] * q[1] - p[1] * q[0] > 1;
}));

const expectPoint = (a: Vec3, b: Vec3) => a.forEach((value, i) => expect(value).toBeCloseTo(b[i] ?? NaN, 8));

describe("frames", () => {
  test("there and back", () => {
    fc.assert(fc.property(frame, point3, (f, p) => {
      expectPoint(applyFrame(invertFrame(f), applyFrame(f, p)), p);
      expectPoint(applyFrame(f, applyFrame(invertFrame(f), p)), p);
    }));
  });
  test("one after the other is their composition", () => {
    fc.assert(fc.property(frame, frame, point3, (f, g, p) => {
      expectPoint(applyFrame(composeFrames(f, g), p), applyFrame(f, applyFrame(g, p)));
    }));
  });
});

describe("convex pieces", () => {
  const isConvex = (polygon: readonly Vec2[]) => polygon.every((b, i) => {
    const a = polygon[(i + polygon.length - 1) % polygon.length] ?? b;
    const c = polygon[(i + 1) % polygon.length] ?? b;
    return (b[0] - a[0]) * (c[1] - b[1]) - (b[1] - a[1]) * (c[0] - b[0]) >= -1e-9;
  });
  test("are convex, counter-clockwise, disjoint and together the polygon", () => {
    fc.assert(fc.property(star, (polygon) => {
      const pieces = convexPieces(polygon);
      pieces.forEach((piece) => expect(isConvex(piece) && signedArea(piece) > 0).toBe(true));
      expect(pieces.reduce((sum, piece) => sum + signedArea(piece), 0)).toBeCloseTo(signedArea(polygon), 6);
      pieces.forEach((a, i) => pieces.slice(0, i).forEach((b) => expect(convexOverlap(a, b)).toBeLessThan(1e-9)));
    }));
  });
  test("leave a hole open", () => {
    const square: readonly Vec2[] = [[0, 0], [100, 0], [100, 100], [0, 100]];
    const hole = circleToChords([40, 60], 20, 0.02);
    const pieces = convexPieces(square, [hole]);
    expect(pieces.reduce((sum, piece) => sum + signedArea(piece), 0)).toBeCloseTo(10_000 - Math.PI * 400, 6);
    expect(pieces.some((piece) => polygonContains(piece, [40, 60]))).toBe(false);
  });
  test("a convex polygon is one piece, an L is two", () => {
    expect(convexPieces([[0, 0], [10, 0], [12, 5], [5, 9]])).toHaveLength(1);
    expect(convexPieces([[0, 0], [10, 0], [10, 4], [4, 4], [4, 10], [0, 10]])).toHaveLength(2);
  });
});

describe("polygons", () => {
  test("a star does not cross itself, a star with two corners swapped does", () => {
    fc.assert(fc.property(star, (polygon) => {
      expect(selfCrossing(polygon)).toBeNull();
    }));
    expect(selfCrossing([[0, 0], [10, 10], [10, 0], [0, 10]])).toEqual({ edges: [0, 2], at: [5, 5] });
    expect(selfCrossing([[0, 0], [10, 0], [4, 0], [4, 5]])).toMatchObject({ edges: [0, 1] });
    expect(selfCrossing([[0, 0], [10, 0], [10, 10], [5, 0], [0, 10]])).not.toBeNull();
  });
  test("a crossing that trying every pair of edges finds is found", () => {
    fc.assert(fc.property(fc.array(fc.tuple(fc.integer({ min: 0, max: 9 }), fc.integer({ min: 0, max: 9 })), { minLength: 4, maxLength: 9 }), (points) => {
      const polygon = points.filter((p, i) => { const q = points[(i + 1) % points.length]; return !q || p[0] !== q[0] || p[1] !== q[1]; });
      const n = polygon.length;
      const apart = (i: number, j: number) => (j - i + n) % n > 1 && (i - j + n) % n > 1;
      const crossing = polygon.some((p, i) => polygon.some((q, j) => apart(i, j) && segmentsCross(p, polygon[(i + 1) % n] ?? p, q, polygon[(j + 1) % n] ?? q) !== null));
      if (crossing) expect(selfCrossing(polygon)).not.toBeNull();
    }));
  });
  test("centroid and area of a triangle; the centroid moves with it", () => {
    expect(polygonCentroid([[0, 0], [6, 0], [0, 3]])).toEqual([2, 1]);
    fc.assert(fc.property(star, coordinate, coordinate, (polygon, x, y) => {
      const [a, b] = [polygonCentroid(polygon), polygonCentroid(polygon.map(([px, py]): Vec2 => [px + x, py + y]))];
      expect(b[0] - a[0]).toBeCloseTo(x, 7);
      expect(b[1] - a[1]).toBeCloseTo(y, 7);
    }));
  });
  test("cleaning keeps the area and drops what says nothing", () => {
    expect(cleanPolygon([[0, 0], [5, 0], [10, 0], [10, 0], [10, 10], [10, 20], [10, 10], [0, 10]])).toEqual([[0, 0], [10, 0], [10, 10], [0, 10]]);
    fc.assert(fc.property(star, (polygon) => {
      const doubled = polygon.flatMap((p, i): Vec2[] => { const q = polygon[(i + 1) % polygon.length] ?? p; return [p, p, [(p[0] + q[0]) / 2, (p[1] + q[1]) / 2]]; });
      expect(signedArea(cleanPolygon(doubled))).toBeCloseTo(signedArea(polygon), 6);
    }));
  });
  test("a bulge of 1 is a half round to the right of its chord, with chords within tolerance", () => {
    const chords = arcToChords([0, 0], [20, 0], 1, 0.02);
    chords.slice(0, -1).forEach((p) => {
      expect(Math.hypot(p[0] - 10, p[1])).toBeCloseTo(10, 9);
      expect(p[1]).toBeLessThan(0);
    });
    [[0, 0] as Vec2, ...chords].forEach((p, i, all) => {
      const q = all[i + 1];
      if (q) expect(Math.hypot((p[0] + q[0]) / 2 - 10, (p[1] + q[1]) / 2)).toBeGreaterThan(10 - 0.02);
    });
    expect(arcToChords([0, 0], [20, 0], 0, 0.02)).toEqual([[20, 0]]);
  });
});

describe("intervals", () => {
  const interval = fc.tuple(fc.integer({ min: -50, max: 50 }), fc.integer({ min: 0, max: 30 })).map(([from, length]): Interval => [from, from + length]);
  const covers = (list: readonly Interval[], x: number) => list.some(([from, to]) => from <= x && x <= to);
  test("what is taken and what is free make up the whole", () => {
    fc.assert(fc.property(interval, fc.array(interval, { maxLength: 6 }), (within, taken) => {
      const free = freeIntervals(within, taken);
      for (let x = within[0] + 0.5; x < within[1]; x++) expect(covers(free, x)).toBe(!covers(taken, x));
      const longest = longestFreeInterval(within, taken);
      expect(longest ? longest[1] - longest[0] : 0).toBe(Math.max(0, ...free.map(([from, to]) => to - from)));
    }));
  });
  test("union and intersection, point by point", () => {
    fc.assert(fc.property(fc.array(interval, { maxLength: 6 }), fc.array(interval, { maxLength: 6 }), (a, b) => {
      const [ma, mb] = [mergeIntervals(a), mergeIntervals(b)];
      const both = intersectIntervals(ma, mb);
      for (let x = -51.5; x < 82; x += 0.5) {
        expect(covers(ma, x)).toBe(covers(a, x));
        expect(covers(both, x)).toBe(covers(a, x) && covers(b, x));
      }
    }));
  });
});
