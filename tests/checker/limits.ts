import { ARC_CHORD_MM, MEANT_CONTACT_MM } from "@/bending";

/** mm. What is shaved off a tool, or off a face, before a meeting counts: the meant contact, an arc drawn as chords on the tool's side, another on the part's. */
export const SHAVED_MM = MEANT_CONTACT_MM + ARC_CHORD_MM + 0.01;

/** mm. Farthest that the chords of a bend zone stand off its true arcs here. */
export const ZONE_CHORD_MM = 0.01;

/**
 * A tool that stands where it must not may be as far as this off the part: the margin across the bed, its corners cut off at
 * 1 / cos(22.5 degrees) = 1.083 of it, and the margin along the bed; and what the chords of a bend zone add.
 */
export const farthestForbidden = (margin: number): number => Math.hypot(1.083 * margin, margin) + MEANT_CONTACT_MM + ZONE_CHORD_MM;
