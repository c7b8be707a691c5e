import type { Frame } from "./frame";

/** Leaves every point where it is. */
export const identityFrame: Frame = { x: [1, 0, 0], y: [0, 1, 0], z: [0, 0, 1], o: [0, 0, 0] };
