/** A plain pair [x, y]. */
export type Vec2 = readonly [number, number];

declare const frame: unique symbol;
/** A point of the unfolded sheet, mm, seen from the base's top. */
export type FlatPoint = Vec2 & { readonly [frame]?: "flat" };
/** A point of a tool's profile: x towards the back of the machine, y up, mm. */
export type ProfilePoint = Vec2 & { readonly [frame]?: "profile" };
