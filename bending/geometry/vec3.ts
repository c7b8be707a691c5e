/** A plain triple [x, y, z]. */
export type Vec3 = readonly [number, number, number];

declare const frame: unique symbol;
/** A point in the folded part's frame (the base face lies in z = 0..t, top up), mm. */
export type PartPoint = Vec3 & { readonly [frame]?: "part" };
/** A point in the machine's frame: x to the back gauge, y up, z along the bed to the operator's right, mm. */
export type MachinePoint = Vec3 & { readonly [frame]?: "machine" };
