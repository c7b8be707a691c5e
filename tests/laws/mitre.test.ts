import Module, { type ManifoldToplevel } from "manifold-3d";
import { beforeAll, describe, expect, test } from "vitest";
import { flatOverlaps, type CornerEntry, type DocumentVertex, type FlangeEntry, type PartDocument } from "@/bending";
import { faceSolids } from "./faceSolids";
import { mustBuild } from "./mustBuild";

let wasm: ManifoldToplevel;
beforeAll(async () => {
  wasm = await Module();
  wasm.setup();
});

const polygon = (corners: number, radius: number): readonly DocumentVertex[] => Array.from({ length: corners }, (_, i) => {
  const a = (2 * Math.PI * i) / corners;
  return [radius * Math.cos(a), radius * Math.sin(a)];
});
const square: readonly DocumentVertex[] = [[0, 0], [200, 0], [200, 120], [0, 120]];

function part(outline: readonly DocumentVertex[], flanges: readonly FlangeEntry[], corner: CornerEntry, more: Partial<PartDocument> = {}) {
  return mustBuild({ format: "part/1", name: "box", units: "mm", material: "S235", thickness: 1.5, insideRadius: 1.5, corner, base: { outline }, flanges, ...more } as PartDocument);
}

const sides = (count: number, angles: readonly number[], length = 30, more: Partial<FlangeEntry> = {}): readonly FlangeEntry[] =>
  Array.from({ length: count }, (_, edge) => ({ id: `s${edge}`, on: "base", edge, length, angle: angles[edge % angles.length] ?? 90, direction: "up", ...more }));
const returns = (count: number, angle: number): readonly FlangeEntry[] =>
  Array.from({ length: count }, (_, k) => ({ id: `r${k}`, on: `s${k}`, edge: 2, length: 12, angle, direction: "up" }));

describe("mitred corners stand the chosen gap apart in the folded part, measured by a solid modeller", () => {
  test.each<[string, readonly DocumentVertex[], readonly FlangeEntry[], readonly (readonly [string, string])[], number]>([
    ["box, square", square, sides(4, [90]), [["s0", "s1"], ["s1", "s2"], ["s3", "s0"]], 0.4],
    ["box, no gap to speak of", square, sides(4, [90]), [["s0", "s1"]], 0.01],
    ["box with a gap wider than its radius", square, sides(4, [90]), [["s0", "s1"], ["s2", "s3"]], 4],
    ["pan with leaning sides", square, sides(4, [60]), [["s0", "s1"], ["s3", "s0"]], 0.5],
    ["sides that lean inwards", square, sides(4, [110]), [["s0", "s1"], ["s3", "s0"]], 0.5],
    ["unequal angles", square, sides(4, [90, 60]), [["s0", "s1"], ["s1", "s2"], ["s3", "s0"]], 0.5],
    ["unequal angles, steep", square, sides(4, [75, 105]), [["s0", "s1"], ["s1", "s2"]], 0.3],
    ["unequal radii", square, sides(4, [90]).map((side, i) => ({ ...side, insideRadius: i % 2 === 0 ? 1 : 4 })), [["s0", "s1"], ["s1", "s2"]], 0.3],
    ["downwards", square, sides(4, [90], 30, { direction: "down" }), [["s0", "s1"]], 0.5],
    ["slanted edges", [[0, 0], [200, 10], [180, 130], [-20, 100]], sides(4, [90]), [["s0", "s1"], ["s1", "s2"], ["s2", "s3"], ["s3", "s0"]], 0.5],
    ["slanted edges, unequal angles", [[0, 0], [200, 10], [180, 130], [-20, 100]], sides(4, [90, 70, 100, 80]), [["s0", "s1"], ["s1", "s2"], ["s2", "s3"], ["s3", "s0"]], 0.5],
    ["five sides", polygon(5, 100), sides(5, [90]), [["s0", "s1"], ["s4", "s0"]], 0.5],
    ["six sides", polygon(6, 100), sides(6, [45]), [["s0", "s1"], ["s5", "s0"]], 0.5],
    ["eight sides", polygon(8, 100), sides(8, [120]), [["s0", "s1"], ["s7", "s0"]], 0.5],
    ["three sides, sharp corners", polygon(3, 150), sides(3, [90]), [["s0", "s1"], ["s2", "s0"]], 0.5],
    ["returns inwards", square, [...sides(4, [90]), ...returns(4, 90)], [["s0", "s1"], ["r0", "r1"], ["r3", "r0"]], 0.5],
    ["returns at an angle", square, [...sides(4, [90]), ...returns(4, 60)], [["r0", "r1"], ["r3", "r0"]], 0.5],
    ["returns of a leaning pan", square, [...sides(4, [70]), ...returns(4, 100)], [["r0", "r1"], ["r3", "r0"]], 0.5],
    ["returns outwards", square, [...sides(4, [90]), ...returns(4, 90).map((entry) => ({ ...entry, direction: "down" as const }))], [["r0", "r1"], ["r3", "r0"]], 0.5],
  ])("%s", (_, outline, flanges, pairs, gap) => {
    const solids = faceSolids(wasm, part(outline, flanges, { kind: "mitre", gap }));
    for (const [a, b] of pairs) {
      const [first, second] = [solids.get(a), solids.get(b)];
      if (!first || !second) throw new Error(`no face ${a} or ${b}`);
      expect(first.minGap(second, 20)).toBeCloseTo(gap, 5);
    }
  });

  test("a re-entrant corner closes as far as the sheet allows, and its flats do not overlap", () => {
    const model = part([[0, 0], [200, 0], [200, 60], [100, 60], [100, 120], [0, 120]], sides(6, [90], 30), { kind: "mitre", gap: 0.5 });
    expect(flatOverlaps(model)).toEqual([]);
    const solids = faceSolids(wasm, model);
    expect(solids.get("s2")?.minGap(solids.get("s3") ?? wasm.Manifold.cube(), 20)).toBeGreaterThan(0.49);
    expect(solids.get("s0")?.minGap(solids.get("s1") ?? wasm.Manifold.cube(), 20)).toBeCloseTo(0.5, 5);
  });

  test("one flange may choose against the part, two that disagree may not", () => {
    const own = part(square, sides(4, [90]).map((side, i) => (i === 0 ? { ...side, corner: { kind: "open" as const } } : side)), { kind: "mitre", gap: 0.5 });
    const solids = faceSolids(wasm, own);
    expect(solids.get("s1")?.minGap(solids.get("s2") ?? wasm.Manifold.cube(), 20)).toBeCloseTo(0.5, 5);
    expect(solids.get("s0")?.minGap(solids.get("s1") ?? wasm.Manifold.cube(), 20)).toBeCloseTo(1.5 * Math.SQRT2, 5);
    expect(() => part(square, sides(4, [90]).map((side, i) => (i < 2 ? { ...side, corner: i === 0 ? { kind: "open" as const } : { kind: "mitre" as const, gap: 1 } } : side)), { kind: "open" }))
      .toThrow('flanges[1].corner');
  });
});
