import fc from "fast-check";
import { describe, expect, test, vi } from "vitest";
import { documentInUnits, flatPattern, foldPoint, signedArea, unfoldPoint, type DocumentVertex, type PartDocument, type PartModel, type Vec3 } from "@/bending";
import { arbitraryProfile, arbitraryTray } from "./arbitraryPart";
import { mustBuild } from "./mustBuild";

// Many random parts on a machine that does other work too: only a hang shall stop it.
vi.setConfig({ testTimeout: 300_000 });

const anyPart = fc.oneof(arbitraryProfile, arbitraryTray);
const finished = (part: PartModel) => part.bends.map((bend) => bend.angle);

/** Corners of each face of the finished part, by face. */
function foldedCorners(part: PartModel): ReadonlyMap<string, readonly Vec3[]> {
  return new Map(part.faces.map((face, i) => [face.id, face.outline.map((p) => foldPoint(part, i, finished(part), [p[0], p[1], 0]))]));
}

function distances(points: readonly Vec3[]): readonly number[] {
  return points.flatMap((p, i) => points.slice(i + 1).map((q) => Math.hypot(p[0] - q[0], p[1] - q[1], p[2] - q[2])));
}

const sorted = (values: readonly number[]) => [...values].sort((a, b) => a - b);

function expectSameNumbers(a: readonly number[], b: readonly number[], digits = 6) {
  expect(a).toHaveLength(b.length);
  a.forEach((value, i) => expect(value).toBeCloseTo(b[i] ?? NaN, digits));
}

/** Flat and folded shape, without regard to where and which way round the part was drawn. */
function expectSameShape(a: PartModel, b: PartModel) {
  expect(flatPattern(a).area).toBeCloseTo(flatPattern(b).area, 5);
  expect([...a.faces.map(({ id }) => id)].sort()).toEqual([...b.faces.map(({ id }) => id)].sort());
  expectSameNumbers(sorted(distances([...foldedCorners(a).values()].flat())), sorted(distances([...foldedCorners(b).values()].flat())));
}

const turned = (document: PartDocument, degrees: number): PartDocument => {
  if (!document.base) return document;
  const [c, s] = [Math.cos((degrees * Math.PI) / 180), Math.sin((degrees * Math.PI) / 180)];
  const turn = (v: DocumentVertex): DocumentVertex => [v[0] * c - v[1] * s + 31, v[0] * s + v[1] * c - 17];
  return {
    ...document,
    base: { outline: document.base.outline.map(turn), holes: document.base.holes?.map((hole) => ("circle" in hole ? { ...hole, circle: turn(hole.circle) as [number, number] } : hole)) ?? [] },
  };
};

describe("a part does not depend on how it was written down", () => {
  test("fold after unfold gives the point back, at any stage of forming", () => {
    fc.assert(fc.property(anyPart, fc.infiniteStream(fc.double({ min: 0, max: 1, noNaN: true })), fc.tuple(fc.double({ min: -100, max: 100, noNaN: true }), fc.double({ min: -100, max: 100, noNaN: true }), fc.double({ min: 0, max: 3, noNaN: true })), (document, share, point) => {
      const part = mustBuild(document);
      const angles = part.bends.map((bend) => bend.angle * (share.next().value ?? 0));
      part.faces.forEach((_, face) => {
        const back = unfoldPoint(part, face, angles, foldPoint(part, face, angles, point));
        back.forEach((value, axis) => expect(value).toBeCloseTo(point[axis] ?? NaN, 8));
      });
    }), { numRuns: 60 });
  });

  test("flat is flat: nothing moves when no bend is formed", () => {
    fc.assert(fc.property(anyPart, (document) => {
      const part = mustBuild(document);
      part.faces.forEach((face, i) => face.outline.forEach((p) => {
        const at = foldPoint(part, i, part.bends.map(() => 0), [p[0], p[1], 1]);
        [p[0], p[1], 1].forEach((value, axis) => expect(at[axis as 0 | 1 | 2]).toBeCloseTo(value, 9));
      }));
    }), { numRuns: 60 });
  });

  test("turned and moved on the sheet", () => {
    fc.assert(fc.property(arbitraryTray, fc.integer({ min: 1, max: 359 }), (document, degrees) => {
      expectSameShape(mustBuild(turned(document, degrees)), mustBuild(document));
    }), { numRuns: 40 });
  });

  test("first vertex elsewhere", () => {
    fc.assert(fc.property(arbitraryTray, fc.integer({ min: 1, max: 3 }), (document, by) => {
      if (!document.base) return;
      const n = document.base.outline.length;
      const shifted: PartDocument = {
        ...document,
        base: { ...document.base, outline: document.base.outline.map((_, i, all) => all[(i + by) % n] ?? [0, 0]) },
        flanges: (document.flanges ?? []).map((flange) => (flange.on === "base" ? { ...flange, edge: (flange.edge + n - by) % n } : flange)),
      };
      expectSameShape(mustBuild(shifted), mustBuild(document));
    }), { numRuns: 40 });
  });

  test("flanges listed in another order, children before parents too", () => {
    fc.assert(fc.property(arbitraryTray, (document) => {
      if (!document.flanges) return;
      expectSameShape(mustBuild({ ...document, flanges: [...document.flanges].reverse() }), mustBuild(document));
    }), { numRuns: 40 });
  });

  test("mirrored: left for right, start for end", () => {
    fc.assert(fc.property(arbitraryTray, (document) => {
      const outline = document.base?.outline;
      if (!outline) return;
      const n = outline.length;
      const mirrored = {
        ...document,
        base: { outline: outline.map((_, i): DocumentVertex => { const v = outline[n - 1 - i] ?? [0, 0]; return [-v[0], v[1]]; }) },
        flanges: (document.flanges ?? []).map(({ start, end, ...flange }) => ({
          ...flange,
          ...(start === undefined ? {} : { end: start }),
          ...(end === undefined ? {} : { start: end }),
          edge: flange.on === "base" ? (2 * n - 2 - flange.edge) % n : flange.edge,
        })),
      } as PartDocument;
      const plain = { ...document, base: { outline } } as PartDocument;
      expectSameShape(mustBuild(mirrored), mustBuild(plain));
    }), { numRuns: 40 });
  });

  test("in inches, and back", () => {
    fc.assert(fc.property(anyPart, (document) => {
      const inches = documentInUnits(document, "in");
      expectSameShape(mustBuild(inches), mustBuild(document));
      const back = documentInUnits(inches, "mm");
      expect(back.thickness).toBeCloseTo(document.thickness, 12);
      expectSameShape(mustBuild(back), mustBuild(document));
    }), { numRuns: 40 });
  });

  test("up for down everywhere is the same part seen from below", () => {
    fc.assert(fc.property(arbitraryProfile, (document) => {
      if (!document.profile) return;
      const flip = { up: "down", down: "up" } as const;
      const other: PartDocument = { ...document, profile: { ...document.profile, bends: document.profile.bends.map((bend) => ({ ...bend, direction: flip[bend.direction] })) } };
      const [a, b] = [mustBuild(document), mustBuild(other)];
      expect(flatPattern(a).width).toBeCloseTo(flatPattern(b).width, 9);
      a.faces.forEach((face, i) => face.outline.forEach((p) => {
        const up = foldPoint(a, i, finished(a), [p[0], p[1], 0]);
        const down = foldPoint(b, i, finished(b), [p[0], p[1], a.thickness]);
        expect(down[2]).toBeCloseTo(a.thickness - up[2], 8);
        expect(down[0]).toBeCloseTo(up[0], 8);
      }));
    }), { numRuns: 60 });
  });
});

test("a profile's blank, taken as a flat with bend lines, folds into the same part", () => {
  fc.assert(fc.property(arbitraryProfile, (document) => {
    const part = mustBuild(document);
    const pattern = flatPattern(part);
    const { profile, ...head } = document;
    const flat = mustBuild({
      ...head,
      flat: {
        outline: pattern.outline.map(([x, y]): DocumentVertex => [x, y]),
        bends: pattern.bendLines.map(({ id, line, direction }, i) => ({ id, line, direction, angle: profile?.bends[i]?.angle ?? NaN })),
      },
    } as PartDocument);
    expect(flatPattern(flat).area).toBeCloseTo(pattern.area, 6);
    expectSameNumbers(sorted(distances([...foldedCorners(flat).values()].flat())), sorted(distances([...foldedCorners(part).values()].flat())), 5);
  }), { numRuns: 40 });
});

test("the blank's area is that of faces and bend zones, less the holes", () => {
  fc.assert(fc.property(anyPart, (document) => {
    const part = mustBuild(document);
    const faces = part.faces.reduce((sum, face) => sum + signedArea(face.outline) - face.holes.reduce((holes, hole) => holes + Math.abs(signedArea(hole)), 0), 0);
    const zones = part.bends.reduce((sum, bend) => sum + signedArea(bend.zone), 0);
    expect(flatPattern(part).area).toBeCloseTo(faces + zones, 4);
  }), { numRuns: 80 });
});
