import type { Frame } from "@/bending/geometry/frame";

/** Does a face with this frame in the machine stand square on the level sheet? (To about 3 degrees.) */
export const standsUpright = (frame: Frame): boolean => Math.abs(frame.z[1]) < 0.05;
