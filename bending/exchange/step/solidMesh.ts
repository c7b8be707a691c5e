/** A body drawn: each face as triangles, in the order of `Solid.faces`. */
export interface SolidMesh {
  /** x, y, z of each corner, mm. */
  readonly positions: readonly number[];
  /** Three corners a triangle. */
  readonly triangles: readonly number[];
  /** For each face, its first entry in `triangles` and how many there are. */
  readonly faces: readonly (readonly [number, number])[];
}
