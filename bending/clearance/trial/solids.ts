import manifoldModule, { type Manifold, type ManifoldToplevel, type Mat4 } from "manifold-3d";
import type { Frame } from "../../geometry/frame";
import type { Vec2 } from "../../geometry/vec2";
import type { Vec3 } from "../../geometry/vec3";

/** Solids of a general modeller, which knows nothing of sheet, punch or die: the slow, obvious way to the same answers. */
export interface Solids {
  plate(outline: readonly Vec2[], holes: readonly (readonly Vec2[])[], thickness: number, frame: Frame): Manifold;
  hull(points: readonly Vec3[]): Manifold;
  /** A profile grown by `grow` (round; negative: shrunk), lifted by `lift`, along z over the whole length. */
  bar(profile: readonly Vec2[], grow: number, lift: number): Manifold;
  /** z-extent and volume of what two solids share; null when nothing. */
  shared(one: Manifold, other: Manifold): { readonly z: readonly [number, number]; readonly volume: number } | null;
}

const LENGTH = 4000;

export async function createSolids(): Promise<Solids> {
  const { Manifold: solid, CrossSection: section } = await started();
  const ring = (points: readonly Vec2[]): [number, number][] => points.map(([x, y]) => [x, y]);
  return {
    plate: (outline, holes, thickness, frame) =>
      solid.extrude(new section([ring(outline), ...holes.map(ring)], "EvenOdd"), thickness).transform(matrix(frame)),
    hull: (points) => solid.hull(points.map(([x, y, z]): [number, number, number] => [x, y, z])),
    bar: (profile, grow, lift) => {
      const flat = new section([ring(profile)], "EvenOdd");
      return solid.extrude(grow === 0 ? flat : flat.offset(grow, "Round", 2, 256), LENGTH).translate([0, lift, -LENGTH / 2]);
    },
    shared: (one, other) => {
      const both = one.intersect(other);
      if (both.isEmpty()) return null;
      const box = both.boundingBox();
      const found = { z: [box.min[2], box.max[2]] as const, volume: both.volume() };
      both.delete();
      return found;
    },
  };
}

async function started(): Promise<ManifoldToplevel> {
  const top = await manifoldModule();
  top.setup();
  return top;
}

function matrix({ x, y, z, o }: Frame): Mat4 {
  return [...x, 0, ...y, 0, ...z, 0, ...o, 1] as Mat4;
}
