import type { Bend } from "../part/partModel";

/** Length of the bend line, mm. */
export const bendLength = ({ line: [[ax, ay], [bx, by]] }: Bend): number => Math.hypot(bx - ax, by - ay);
