import type { Mm, Rad } from "../core/units";
import type { Vec3 } from "../geometry/vec3";
import type { Hit } from "../clearance/hit";

/** One step of a plan as far as its errors go: what it forms, and what the back gauge holds meanwhile. */
export interface GaugedStep extends Hit {
  /** Null when no finger touches anything: the bend line is then set by eye, and nothing bounds its error. */
  readonly touch: Touch | null;
}

/** The place of the part that the fingers touch. */
export interface Touch {
  readonly face: number;
  /** In the unfolded sheet, z from 0 to the thickness. */
  readonly point: Vec3;
  /** Of a slanted edge: millimetres of depth a millimetre along the bed, before the stroke. */
  readonly slope: number;
  /** The hem whose fold is touched; `face` is then the sheet that it lies on. The fold moves with the hem's line. */
  readonly fold?: number;
}

/** How well the brake repeats: every stop of the gauge and every angle stays within plus and minus this. */
export interface Repeats {
  readonly gauge: Mm;
  readonly angle: Rad;
}
