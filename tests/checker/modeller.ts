import manifoldModule, { type CrossSection, type Manifold, type ManifoldToplevel, type Mat4 } from "manifold-3d";
import type { Ring } from "./convexParts";
import type { Placing, Point } from "./placing";

/** A general solid modeller, which knows nothing of sheet, punch or die: its word is the last. */
export interface Modeller {
  /** A region grown by `by` (round), or shrunk when `by` is negative. */
  grown(ring: Ring, by: number): readonly Ring[];
  plate(outline: Ring, holes: readonly Ring[], thickness: number, placing: Placing): Manifold;
  /** The hull of each group of points, together. */
  hulls(groups: readonly (readonly Point[])[]): Manifold;
  bar(rings: readonly Ring[], lift: number, from: number, to: number): Manifold;
  /** Volume that two solids share. */
  shared(one: Manifold, other: Manifold): number;
}

export async function createModeller(): Promise<Modeller> {
  const top: ManifoldToplevel = await manifoldModule();
  top.setup();
  const plain = (ring: Ring): [number, number][] => ring.map(([x, y]) => [x, y]);
  /** What is only made on the way to something else is given back: the modeller's memory is its own. */
  const through = <Made extends CrossSection | Manifold, T>(made: Made, read: (made: Made) => T): T => {
    const result = read(made);
    made.delete();
    return result;
  };
  return {
    grown: (ring, by) => through(new top.CrossSection([plain(ring)], "NonZero"), (flat) => through(flat.offset(by, "Round", 2, 64), (made) => made.toPolygons())),
    plate: (outline, holes, thickness, m) => {
      const at = (i: number) => m[i] ?? 0;
      const matrix: Mat4 = [at(0), at(4), at(8), 0, at(1), at(5), at(9), 0, at(2), at(6), at(10), 0, at(3), at(7), at(11), 1];
      return through(new top.CrossSection([outline, ...holes].map(plain), "EvenOdd"), (flat) => through(top.Manifold.extrude(flat, thickness), (solid) => solid.transform(matrix)));
    },
    hulls: (groups) => {
      const hulls = groups.map((points) => top.Manifold.hull(points.map(([x, y, z]): [number, number, number] => [x, y, z])));
      const together = top.Manifold.union(hulls);
      for (const hull of hulls) hull.delete();
      return together;
    },
    bar: (rings, lift, from, to) => through(new top.CrossSection(rings.map(plain), "NonZero"), (flat) => through(top.Manifold.extrude(flat, to - from), (solid) => solid.translate([0, lift, from]))),
    shared: (one, other) => through(one.intersect(other), (both) => both.volume()),
  };
}
