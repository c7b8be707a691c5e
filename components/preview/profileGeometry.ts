import { ExtrudeGeometry, Shape, Vector2, type BufferGeometry } from "three";
import type { ProfilePoint } from "@/bending/geometry/vec2";

/** A tool's profile run along the bed from z = 0 to `length`. */
export const profileGeometry = (profile: readonly ProfilePoint[], length: number): BufferGeometry =>
  new ExtrudeGeometry(new Shape(profile.map(([x, y]) => new Vector2(x, y))), { depth: length, bevelEnabled: false, steps: 1 });
