import Module, { type Manifold, type ManifoldToplevel } from "manifold-3d";
import { beforeAll, describe, expect, test } from "vitest";
import {
  buildPart, documentInUnits, flatContours, flatPattern, foldZonePoint, invariant, materialById, mmPer, readPartDocument, sheetRegions, signedArea, zoneStrips,
  type FlatRegion, type PartModel,
} from "@/bending";
import { faceSolids } from "../laws/faceSolids";
import { partCorpus, type PartCase, type SolidPiece } from "./partCorpus";

let wasm: ManifoldToplevel;
beforeAll(async () => {
  wasm = await Module();
  wasm.setup();
});

const cases = partCorpus();
/** Segments of a whole turn, for the rings of the hand-built bodies; the area between chord and arc is under 1 in 15 000. */
const SEGMENTS = 360;

function build({ document }: PartCase): PartModel {
  const read = readPartDocument(document);
  invariant(read.ok, read.ok ? "" : JSON.stringify(read.error));
  const built = buildPart(read.value, { materials: materialById });
  invariant(built.ok, built.ok ? "" : JSON.stringify(built.error));
  return built.value;
}

function section({ polygon, arc }: SolidPiece): readonly [number, number][] {
  if (!arc) return (polygon ?? []).map(([x, y]) => [x, y]);
  const count = Math.max(2, Math.ceil((Math.abs(arc.turn) / 360) * SEGMENTS));
  const at = (i: number, radius: number): [number, number] => {
    const a = ((arc.start + (arc.turn * i) / count) * Math.PI) / 180;
    return [arc.centre[0] + radius * Math.cos(a), arc.centre[1] + radius * Math.sin(a)];
  };
  const outer = Array.from({ length: count + 1 }, (_, i) => at(i, arc.outer));
  return arc.inner === 0 ? [...outer, [arc.centre[0], arc.centre[1]]] : [...outer, ...Array.from({ length: count + 1 }, (_, i) => at(count - i, arc.inner))];
}

function solidOf(pieces: readonly SolidPiece[], scale: number): Manifold {
  return wasm.Manifold.union(pieces.map((piece) => {
    const { u, v, w, origin } = piece;
    const drawn = new wasm.CrossSection([section(piece).map(([x, y]): [number, number] => [x * scale, y * scale])], "NonZero");
    const right = (u[1] * v[2] - u[2] * v[1]) * w[0] + (u[2] * v[0] - u[0] * v[2]) * w[1] + (u[0] * v[1] - u[1] * v[0]) * w[2] > 0;
    const flipped = drawn.area() > 0 ? drawn : new wasm.CrossSection([section(piece).map(([x, y]): [number, number] => [x * scale, y * scale]).reverse()], "NonZero");
    invariant(right, `${JSON.stringify([u, v, w])} is not right-handed`);
    return wasm.Manifold.extrude(flipped, (piece.to - piece.from) * scale)
      .translate([0, 0, piece.from * scale])
      .transform([...u, 0, ...v, 0, ...w, 0, origin[0] * scale, origin[1] * scale, origin[2] * scale, 1]);
  }));
}

const scaleOf = ({ document }: PartCase) => mmPer(document.units);
const with_ = (key: keyof PartCase["expected"]) => cases.filter(({ expected }) => expected[key] !== undefined).map((one) => [one.name, one] as const);

test("the corpus is as large as it has to be", () => {
  expect(cases.length).toBeGreaterThanOrEqual(40);
  expect(cases.filter(({ derivation }) => derivation.length === 0)).toEqual([]);
});

describe("the flat is what was worked out by hand", () => {
  test.each(cases.map((one) => [one.name, one] as const))("%s", (_, one) => {
    const part = build(one);
    const scale = scaleOf(one);
    const { width, depth, area } = flatPattern(part);
    const { expected } = one;
    expect(area / scale ** 2).toBeCloseTo(expected.area, 4);
    if (expected.width !== undefined) expect(width / scale).toBeCloseTo(expected.width, 5);
    if (expected.depth !== undefined) expect(depth / scale).toBeCloseTo(expected.depth, 5);
  });
});

test.each(with_("bends"))("bend lines lie in the middle of their allowance: %s", (_, one) => {
  const part = build(one);
  for (const [id, ends] of Object.entries(one.expected.bends ?? {})) {
    const bend = part.bends.find((candidate) => candidate.id === id);
    const line = (bend?.line ?? []).map(([x, y]) => [x / scaleOf(one), y / scaleOf(one)] as const);
    for (const [x, y] of ends) expect(Math.min(...line.map((p) => Math.hypot(p[0] - x, p[1] - y)))).toBeLessThan(1e-4);
  }
});

test.each(with_("folded"))("the folded part measures what its document says: %s", (_, one) => {
  const { min, max } = wasm.Manifold.compose([...faceSolids(wasm, build(one)).values()]).boundingBox();
  one.expected.folded?.forEach((size, axis) => expect(((max[axis] ?? NaN) - (min[axis] ?? NaN)) / scaleOf(one)).toBeCloseTo(size, 5));
});

test.each(with_("solid"))("the folded body built by hand has the volume of the flat (K = 0.5), and the faces lie in it: %s", (_, one) => {
  const part = build(one);
  const body = solidOf(one.expected.solid ?? [], scaleOf(one));
  expect(body.volume() / (flatPattern(part).area * part.thickness)).toBeCloseTo(1, 4);
  const faces = wasm.Manifold.union([...faceSolids(wasm, part).values()]);
  expect(wasm.Manifold.difference([faces, body]).volume() / faces.volume()).toBeLessThan(1e-5);
});

test.each(with_("gaps"))("mitres stand as far apart as they were told to: %s", (_, one) => {
  const solids = faceSolids(wasm, build(one));
  for (const [a, b, gap] of one.expected.gaps ?? []) {
    expect(solids.get(a)?.minGap(solids.get(b) ?? wasm.Manifold.cube(), 20)).toBeCloseTo(gap, 4);
  }
});

test.each(with_("across"))("holes over bends are told: %s", (_, one) => {
  const part = build(one);
  expect(part.holesAcross.map(({ path, bends }) => [path, bends.map((i) => part.bends[i]?.id)])).toEqual(one.expected.across);
});

describe("the sheet with everything taken off it, bent", () => {
  const cut = cases.filter(({ name }) => /across|flat-|tab-/.test(name));
  test.each(cut.map((one) => [one.name, one] as const))("%s: pieces add up to the flat, and each strip of a bend goes where its corners are bent to", (_, one) => {
    const part = build(one);
    const { faces, zones } = sheetRegions(part);
    const area = (regions: readonly FlatRegion[]) => regions.reduce((sum, { outline, holes }) => sum + Math.abs(signedArea(outline)) - holes.reduce((taken, hole) => taken + Math.abs(signedArea(hole)), 0), 0);
    const strips = part.bends.map((_bend, i) => zoneStrips(part, i, zones[i] ?? [], 6));
    const inFaces = faces.reduce((sum, regions) => sum + area(regions), 0);
    const inZones = zones.reduce((sum, regions) => sum + area(regions), 0);
    // Outer arcs stand as chords in the pieces.
    expect((inFaces + inZones) / flatPattern(part).area).toBeCloseTo(1, 3);
    expect(strips.flat().reduce((sum, strip) => sum + signedArea(strip), 0)).toBeCloseTo(inZones, 4);
    const angles = part.bends.map((bend) => bend.angle);
    strips.forEach((pieces, i) => pieces.forEach((piece) => {
      const bent = piece.map(([x, y]) => foldZonePoint(part, i, angles, [x, y, 0]));
      // Bending stretches nothing by more than the outermost fibre: 1 + thickness / neutral radius.
      piece.forEach((p, k) => piece.slice(k + 1).forEach((q, l) => {
        const [a, b] = [bent[k], bent[k + 1 + l]];
        const flat = Math.hypot(p[0] - q[0], p[1] - q[1]);
        if (a && b) expect(Math.hypot(a[0] - b[0], a[1] - b[1], a[2] - b[2])).toBeLessThanOrEqual(flat * (1 + (part.thickness / ((part.bends[i]?.allowance ?? 1) / (part.bends[i]?.angle ?? 1)))) + 1e-9);
      }));
    }));
  });
});

test("arcs of the drawing are arcs of the flat", () => {
  const arcs = (name: string) => {
    const one = cases.find((candidate) => candidate.name === name);
    invariant(one, name);
    const { outline, holes } = flatContours(build(one));
    return [outline.vertices.filter(([, , bulge]) => bulge !== 0).length, holes.filter(({ kind }) => kind === "circle").length];
  };
  expect(arcs("tab-round")).toEqual([2, 0]);
  expect(arcs("own-outline")).toEqual([1, 1]);
  expect(arcs("arc-corner")).toEqual([1, 0]);
  expect(arcs("holes")).toEqual([0, 2]);
  expect(arcs("flat-corner-holes")[0]).toBe(4);
});

test("inches and millimetres are one part", () => {
  for (const one of cases) {
    const read = readPartDocument(one.document);
    invariant(read.ok, one.name);
    const other = buildPart(documentInUnits(read.value, read.value.units === "mm" ? "in" : "mm"), { materials: materialById });
    invariant(other.ok, one.name);
    expect(flatPattern(other.value).area).toBeCloseTo(flatPattern(build(one)).area, 4);
  }
});
