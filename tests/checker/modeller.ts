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
  together(solids: readonly Manifold[]): Manifold;
}

export async function createModeller(): Promise<Modeller> {
  const top: ManifoldToplevel = await manifoldModule();
  top.setup();
  const plain = (ring: Ring): [number, number][] => ring.map(([x, y]) => [x, y]);
  const done = <T>(section: CrossSection, read: (section: CrossSection) => T): T => {
    const made = read(section);
    section.delete();
    return made;
  };
  return {
    grown: (ring, by) => done(new top.CrossSection([plain(ring)], "NonZero"), (flat) => done(flat.offset(by, "Round", 2, 64), (made) => made.toPolygons())),
    plate: (outline, holes, thickness, m) => {
      const at = (i: number) => m[i] ?? 0;
      const matrix: Mat4 = [at(0), at(4), at(8), 0, at(1), at(5), at(9), 0, at(2), at(6), at(10), 0, at(3), at(7), at(11), 1];
      return done(new top.CrossSection([outline, ...holes].map(plain), "EvenOdd"), (flat) => top.Manifold.extrude(flat, thickness).transform(matrix));
    },
    hulls: (groups) => top.Manifold.union(groups.map((points) => top.Manifold.hull(points.map(([x, y, z]): [number, number, number] => [x, y, z])))),
    bar: (rings, lift, from, to) => done(new top.CrossSection(rings.map(plain), "NonZero"), (flat) => top.Manifold.extrude(flat, to - from).translate([0, lift, from])),
    shared: (one, other) => {
      const both = one.intersect(other);
      const volume = both.volume();
      both.delete();
      return volume;
    },
    together: (solids) => top.Manifold.union([...solids]),
  };
}
