import fc from "fast-check";
import { describe, expect, test } from "vitest";
import {
  documentInUnits, flatDocument, flatOverlaps, flatPattern, foldPoint, foldZonePoint, reroot, signedArea, unfoldPoint, unfoldZonePoint,
  type DocumentHole, type DocumentVertex, type FlangeEntry, type PartDocument, type PartModel, type Vec3,
} from "@/bending";
import { arbitraryTree } from "./arbitraryTree";
import { mustBuild } from "./mustBuild";

const RUNS = { numRuns: 10 };
const finished = (part: PartModel) => part.bends.map((bend) => bend.angle);
const area = (ring: readonly (readonly [number, number])[]) => Math.abs(signedArea(ring));

const folded = (part: PartModel): readonly Vec3[] =>
  part.faces.flatMap((face, i) => face.outline.flatMap((p) => [0, part.thickness].map((z) => foldPoint(part, i, finished(part), [p[0], p[1], z]))));

function expectSameShape(a: PartModel, b: PartModel, digits = 5) {
  expect(flatPattern(a).area).toBeCloseTo(flatPattern(b).area, 4);
  const spread = (part: PartModel) => {
    const points = folded(part);
    const middle = [0, 1, 2].map((axis) => points.reduce((sum, p) => sum + (p[axis] ?? 0), 0) / points.length);
    const radii = points.map((p) => Math.hypot(p[0] - (middle[0] ?? 0), p[1] - (middle[1] ?? 0), p[2] - (middle[2] ?? 0))).sort((p, q) => p - q);
    const steps = points.map((p, i) => Math.hypot(...p.map((value, axis) => value - (points[(i + 2) % points.length]?.[axis] ?? 0)))).sort((p, q) => p - q);
    return [radii, steps] as const;
  };
  const [[radiiA, stepsA], [radiiB]] = [spread(a), spread(b)];
  expect(radiiA.length).toBe(radiiB.length);
  radiiA.forEach((radius, i) => expect(radius).toBeCloseTo(radiiB[i] ?? NaN, digits));
  expect(stepsA.length).toBe(radiiA.length);
}

const turnPoint = (degrees: number) => {
  const [c, s] = [Math.cos((degrees * Math.PI) / 180), Math.sin((degrees * Math.PI) / 180)];
  return (v: readonly number[]): [number, number] => [(v[0] ?? 0) * c - (v[1] ?? 0) * s + 31, (v[0] ?? 0) * s + (v[1] ?? 0) * c - 17];
};
const withBase = (document: PartDocument, point: (v: readonly number[]) => [number, number], flanges = document.flanges ?? [], reverse = false): PartDocument => ({
  ...document,
  base: {
    outline: reverse ? [...(document.base?.outline ?? [])].reverse().map(point) : (document.base?.outline ?? []).map(point),
    holes: (document.base?.holes ?? []).map((hole): DocumentHole => ("circle" in hole ? { ...hole, circle: point(hole.circle) } : hole)),
  },
  flanges,
}) as PartDocument;

describe("any tree of flanges is the same part however it is written down", () => {
  test("turned and moved", () => {
    fc.assert(fc.property(arbitraryTree, fc.integer({ min: 1, max: 359 }), (document, degrees) => {
      expectSameShape(mustBuild(withBase(document, turnPoint(degrees))), mustBuild(document));
    }), RUNS);
  });

  test("its outline begun at another corner", () => {
    fc.assert(fc.property(arbitraryTree, fc.integer({ min: 1, max: 7 }), (document, by) => {
      const outline = document.base?.outline ?? [];
      const n = outline.length;
      const shifted = { ...document, base: { ...document.base, outline: outline.map((_, i): DocumentVertex => outline[(i + by) % n] ?? [0, 0]) }, flanges: (document.flanges ?? []).map((flange) => (flange.on === "base" ? { ...flange, edge: (flange.edge + 8 * n - by) % n } : flange)) } as PartDocument;
      expectSameShape(mustBuild(shifted), mustBuild(document));
    }), RUNS);
  });

  test("its flanges renamed and listed in another order", () => {
    fc.assert(fc.property(arbitraryTree, (document) => {
      const name = (id: string) => (id === "base" ? id : `f ${id}`);
      const renamed = { ...document, flanges: [...(document.flanges ?? [])].reverse().map((flange) => ({ ...flange, id: name(flange.id), on: name(flange.on) })) } as PartDocument;
      expectSameShape(mustBuild(renamed), mustBuild(document));
    }), RUNS);
  });

  test("mirrored, each bend keeping its direction", () => {
    fc.assert(fc.property(arbitraryTree, (document) => {
      const n = document.base?.outline.length ?? 0;
      const whole = (document.flanges ?? []).map((flange): FlangeEntry => ({ ...flange, holes: [] }));
      const flanges = whole.map((flange) => (flange.on === "base" ? { ...flange, edge: (2 * n - 2 - flange.edge) % n } : flange));
      const plain = { ...document, flanges: whole } as PartDocument;
      expectSameShape(mustBuild(withBase(document, (v) => [-(v[0] ?? 0), v[1] ?? 0], flanges, true)), mustBuild(plain));
    }), RUNS);
  });

  test("in inches", () => {
    fc.assert(fc.property(arbitraryTree, (document) => expectSameShape(mustBuild(documentInUnits(document, "in")), mustBuild(document))), RUNS);
  });

  test("hung on another face: one rigid motion takes the folded part to itself", () => {
    fc.assert(fc.property(arbitraryTree, fc.nat(), (document, pick) => {
      const part = mustBuild(document);
      const base = pick % part.faces.length;
      const other = reroot(part, base);
      expectSameShape(other, part);
      expect(other.faces[0]?.id).toBe(part.faces[base]?.id);
      const back = reroot(other, other.faces.findIndex(({ id }) => id === "base"));
      part.faces.forEach((face, i) => face.outline.forEach((p) => {
        const k = back.faces.findIndex(({ id }) => id === face.id);
        const [was, is] = [foldPoint(part, i, finished(part), [p[0], p[1], 0]), foldPoint(back, k, finished(back), [p[0], p[1], 0])];
        was.forEach((value, axis) => expect(is[axis]).toBeCloseTo(value, 6));
      }));
    }), RUNS);
  });
});

describe("unfold", () => {
  test("the flat's area is that of faces, bend zones and holes across, and no flats overlap", () => {
    fc.assert(fc.property(arbitraryTree, (document) => {
      const part = mustBuild(document);
      expect(flatOverlaps(part)).toEqual([]);
      const faces = part.faces.reduce((sum, face) => sum + area(face.outline) - face.holes.reduce((taken, hole) => taken + area(hole), 0), 0);
      const zones = part.bends.reduce((sum, bend) => sum + area(bend.zone), 0);
      const across = part.holesAcross.reduce((sum, hole) => sum + area(hole.outline), 0);
      const flat = flatPattern({ ...part, circles: [] });
      expect(flat.area).toBeCloseTo(faces + zones - across, 4);
    }), RUNS);
  });

  test("the flat with its bend lines folds into the same part, face by face, corner by corner", () => {
    fc.assert(fc.property(arbitraryTree, (document) => {
      const part = mustBuild(document);
      const again = mustBuild(flatDocument(part, "mm"));
      expect(flatPattern(again).area).toBeCloseTo(flatPattern(part).area, 4);
      expect([...again.faces.map(({ id }) => id)].sort()).toEqual([...part.faces.map(({ id }) => id)].sort());
      expect(again.holesAcross.length).toBe(part.holesAcross.length);
      part.faces.forEach((face, i) => {
        const k = again.faces.findIndex(({ id }) => id === face.id);
        const corners = again.faces[k]?.outline.map((p) => foldPoint(again, k, finished(again), [p[0], p[1], 0])) ?? [];
        // Chords of a round relief may be cut otherwise; its circle is the same.
        const straight = face.outline.filter((p) => !part.circles.some(({ centre, radius }) => Math.abs(Math.hypot(p[0] - centre[0], p[1] - centre[1]) - radius) < 1e-6));
        for (const p of straight) {
          const at = foldPoint(part, i, finished(part), [p[0], p[1], 0]);
          expect(Math.min(...corners.map((q) => Math.hypot(at[0] - q[0], at[1] - q[1], at[2] - q[2])))).toBeLessThan(1e-4);
        }
      });
    }), RUNS);
  });

  test("every corner of every face and every point of every bend maps to the folded part and back", () => {
    fc.assert(fc.property(arbitraryTree, fc.double({ min: 0.05, max: 1, noNaN: true }), fc.double({ min: 0, max: 1, noNaN: true }), (document, share, across) => {
      const part = mustBuild(document);
      const angles = part.bends.map((bend) => bend.angle * share);
      const same = (p: Vec3, q: Vec3) => p.forEach((value, axis) => expect(q[axis]).toBeCloseTo(value, 6));
      part.faces.forEach((face, i) => face.outline.forEach((p) => same([p[0], p[1], 0.5], unfoldPoint(part, i, angles, foldPoint(part, i, angles, [p[0], p[1], 0.5])))));
      part.bends.forEach(({ zone: [p, q], parent, child }, i) => {
        const at: Vec3 = [p[0] + (q[0] - p[0]) * across, p[1] + (q[1] - p[1]) * across, 0.3];
        same(at, unfoldZonePoint(part, i, angles, foldZonePoint(part, i, angles, at)));
        // The zone joins its faces without a step.
        same(foldPoint(part, parent, angles, [p[0], p[1], 0.3]), foldZonePoint(part, i, angles, [p[0], p[1], 0.3]));
        same(foldPoint(part, child, angles, [q[0], q[1], 0.3]), foldZonePoint(part, i, angles, [q[0], q[1], 0.3]));
      });
    }), RUNS);
  });
});
