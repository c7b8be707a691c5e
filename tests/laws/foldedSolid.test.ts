import Module, { type Manifold, type ManifoldToplevel } from "manifold-3d";
import { beforeAll, describe, expect, test, vi } from "vitest";
import { applyFrame, bendFacets, flatPattern, foldFrames, signedArea, type FlangeEntry, type PartDocument, type PartModel, type ProfileBend, type Vec3 } from "@/bending";
import { mustBuild } from "./mustBuild";

// Many random parts on a machine that does other work too: only a hang shall stop it.
vi.setConfig({ testTimeout: 300_000 });

let wasm: ManifoldToplevel;
beforeAll(async () => {
  wasm = await Module();
  wasm.setup();
});

const FACETS = 24;

/** Faces as extruded plates and bends as wedges, each a solid of its own, in the part frame. */
function solids(part: PartModel, angles = part.bends.map((bend) => bend.angle as number)): { faces: Manifold[]; zones: Manifold[] } {
  const frames = foldFrames(part, angles);
  const faces = part.faces.map((face, i) => {
    const { x, y, z, o } = frames[i] ?? { x: [1, 0, 0], y: [0, 1, 0], z: [0, 0, 1], o: [0, 0, 0] };
    const rings = [face.outline, ...face.holes].map((ring) => ring.map(([px, py]): [number, number] => [px, py]));
    return wasm.Manifold.extrude(new wasm.CrossSection(rings, "EvenOdd"), part.thickness).transform([...x, 0, ...y, 0, ...z, 0, ...o, 1]);
  });
  const zones = part.bends.flatMap((bend, i) => bendFacets(part, i, angles[i] ?? 0, FACETS).map((facet) =>
    wasm.Manifold.hull([...facet.inside, ...facet.outside].map((p): [number, number, number] => {
      const frame = frames[bend.parent];
      const [px, py, pz]: Vec3 = frame ? applyFrame(frame, p) : p;
      return [px, py, pz];
    }))));
  return { faces, zones };
}

const volume = (parts: readonly Manifold[]) => parts.reduce((sum, part) => sum + part.volume(), 0);

const profile = (legs: readonly number[], bends: readonly ProfileBend[], more: Partial<PartDocument> = {}): PartDocument =>
  ({ format: "part/1", name: "profile", units: "mm", material: "S235", thickness: 2, insideRadius: 2, ...more, profile: { width: 100, legs, bends } }) as PartDocument;
const up = { angle: 90, direction: "up" } as const;
const down = { angle: 90, direction: "down" } as const;

/** Outside size of the plates (the bends lie within, as they turn no further than their plates). */
function outsideSize(part: PartModel): readonly number[] {
  const { min, max } = wasm.Manifold.compose(solids(part).faces).boundingBox();
  return [0, 1, 2].map((axis) => (max[axis] ?? NaN) - (min[axis] ?? NaN));
}

const fourSides = (length: number, taper: number): readonly FlangeEntry[] => [0, 1, 2, 3].flatMap((edge): readonly FlangeEntry[] => [
  { id: `side${edge}`, on: "base", edge, length, ...up },
  { id: `back${edge}`, on: `side${edge}`, edge: 2, length: 12, ...up, startAngle: taper, endAngle: taper, start: 0.5, end: 0.5 },
]);
const tray = (flanges: readonly FlangeEntry[], more: Partial<PartDocument> = {}): PartDocument =>
  ({ format: "part/1", name: "tray", units: "mm", material: "S235", thickness: 1.5, insideRadius: 1.5, base: { outline: [[0, 0], [200, 0], [200, 120], [0, 120]] }, flanges, ...more }) as PartDocument;

describe("the folded part measures what the document says", () => {
  test.each<[string, PartDocument, readonly number[]]>([
    ["U 40/100/40, its web upright", profile([40, 100, 40], [up, up]), [40, 100, 100]],
    ["Z 40/60/30: up, then down", profile([40, 60, 30], [up, down]), [40 + 30 - 2, 100, 60]],
    ["hat 20/40/60/40/20", profile([20, 40, 60, 40, 20], [up, down, down, up]), [20 + 60 + 20 - 2 * 2, 100, 40]],
    ["L 50/30 down", profile([50, 30], [down]), [50, 100, 30]],
    ["inside dimensions: U 40/100/40 is one thickness more outside", profile([40, 100, 40], [up, up], { dimension: "inside" }), [42, 100, 104]],
    ["tangent dimensions: the bend comes on top", profile([40, 100, 40], [up, up], { dimension: "tangent" }), [44, 100, 108]],
    ["closed hem 50/10: overall length stays 50", profile([50, 10], [{ angle: 180, direction: "up", hem: "closed" }], { thickness: 1 }), [50 - 1, 100, 2]],
    ["open hem, gap 3", profile([50, 14], [{ angle: 180, direction: "up", hem: "open", gap: 3 }], { thickness: 1 }), [50 - 2.5, 100, 5]],
    ["tray 200 x 120 x 30", tray(fourSides(30, 45)), [200, 120, 30]],
    ["inch: 1 x 2 x 1 channel", { ...profile([], []), units: "in", thickness: 0.04, insideRadius: 0.16, profile: { width: 3, legs: [1, 2, 1], bends: [up, up] } } as PartDocument, [25.4, 76.2, 50.8]],
  ])("%s", (_, document, size) => {
    outsideSize(mustBuild(document)).forEach((value, axis) => expect(value).toBeCloseTo(size[axis] ?? NaN, 6));
  });

  test("over 90 degrees the leg runs to the outermost tangent of the bend", () => {
    const part = mustBuild(profile([50, 30], [{ angle: 135, direction: "up" }]));
    const { faces, zones } = solids(part);
    const box = wasm.Manifold.compose([faces[0], ...zones].filter((solid) => solid !== undefined)).boundingBox();
    // The wedges are circumscribed, so they stand out by a hair.
    expect((box.max[0] ?? NaN) - (box.min[0] ?? NaN)).toBeGreaterThanOrEqual(50 - 1e-9);
    expect((box.max[0] ?? NaN) - (box.min[0] ?? NaN)).toBeLessThan(50 + 0.01);
  });
});

describe("the folded solid", () => {
  const half = { kFactor: 0.5 };
  const parts: readonly [string, PartDocument][] = [
    ["U", profile([40, 100, 40], [up, up], half)],
    ["hat", profile([20, 40, 60, 40, 20], [up, down, down, up], half)],
    ["acute", profile([50, 60, 40], [{ angle: 135, direction: "up" }, { angle: 30, direction: "down" }], half)],
    ["tray with mitred returns", tray(fourSides(30, 45), half)],
    ["tab with reliefs", tray([{ id: "tab", on: "base", edge: 0, length: 30, ...down, start: 40, end: 60, relief: { kind: "round" }, holes: [{ circle: [50, 18], diameter: 8 }] }], half)],
  ];

  test.each(parts)("%s: with the neutral line in the middle, folding keeps the volume", (_, document) => {
    const part = mustBuild(document);
    const { faces, zones } = solids(part);
    const blank = flatPattern(part).area * part.thickness;
    const facesAlone = part.faces.reduce((sum, face) => sum + signedArea(face.outline) - face.holes.reduce((taken, hole) => taken + Math.abs(signedArea(hole)), 0), 0);
    expect(volume(faces)).toBeCloseTo(facesAlone * part.thickness, 3);
    // Wedges lie outside the true arc on both sides, by less than 0.1 %.
    expect(volume(zones) / (blank - volume(faces))).toBeGreaterThan(1);
    expect(volume(zones) / (blank - volume(faces))).toBeLessThan(1.002);
  });

  test.each(parts)("%s: faces and bends meet without overlapping, half formed and finished", (_, document) => {
    const part = mustBuild(document);
    for (const share of [0.5, 1]) {
      const { faces, zones } = solids(part, part.bends.map((bend) => bend.angle * share));
      const all = [...faces, ...zones];
      const united = wasm.Manifold.union(all);
      expect(united.volume() / volume(all)).toBeGreaterThan(1 - 1e-4);
    }
  });

  test("bend wedges hold the true arc", () => {
    const part = mustBuild(profile([40, 60], [{ angle: 100, direction: "up" }]));
    const bend = part.bends[0];
    if (!bend) throw new Error("no bend");
    for (const count of [1, 3, 8]) {
      const wedges = bendFacets(part, 0, bend.angle, count).map((facet) => wasm.Manifold.hull([...facet.inside, ...facet.outside].map((p): [number, number, number] => [p[0], p[1], p[2]])));
      const arc = wasm.CrossSection.ofPolygons([arcRing(bend.insideRadius, part.thickness, bend.angle)]).extrude(100)
        .transform([1, 0, 0, 0, 0, 0, 1, 0, 0, -1, 0, 0, 40 - 4 * 1, 100, part.thickness + bend.insideRadius, 1]);
      expect(arc.subtract(wasm.Manifold.union(wedges)).volume()).toBeLessThan(arc.volume() * 2e-3 * count);
    }
  });
});

/** The bend's section about its centre, from straight down, counter-clockwise. */
function arcRing(insideRadius: number, thickness: number, angle: number): [number, number][] {
  const at = (radius: number, i: number): [number, number] => [radius * Math.sin((angle * i) / 200), -radius * Math.cos((angle * i) / 200)];
  const steps = Array.from({ length: 201 }, (_, i) => i);
  return [...steps.map((i) => at(insideRadius + thickness, i)), ...steps.reverse().map((i) => at(insideRadius, i))];
}
