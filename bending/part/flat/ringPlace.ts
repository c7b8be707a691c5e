import type { Vec2 } from "../../geometry/vec2";

/** A place on the boundary of a sheet: on edge `edge` of ring `ring`, `share` of the way along it (0 = at its first point). */
export interface RingPlace {
  readonly ring: number;
  readonly edge: number;
  readonly share: number;
  readonly point: Vec2;
}

/** The boundary of a sheet: the outline counter-clockwise, then holes clockwise, so that material lies on the left. */
export type Rings = readonly (readonly Vec2[])[];
