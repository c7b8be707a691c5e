import type { Vec3 } from "../../geometry/vec3";

/** Triangles of one closed body, mm, in the part's frame; three corners a triangle, counter-clockwise seen from outside. */
export interface FoldedMesh {
  readonly name: string;
  readonly kind: "face" | "bend";
  readonly corners: readonly Vec3[];
  /** Unit normal at each corner; smooth along a bend. */
  readonly normals: readonly Vec3[];
}
