import type { Vec3 } from "../geometry/vec3";
import type { HingeFrame } from "./hingeFrame";

/** A side of a flange: at distance d from the end of its bend it lies `at + lean d` along the edge, from the edge's first corner. */
export interface SideLine {
  readonly at: number;
  readonly lean: number;
}

/** One of two flanges that meet, with how far its reference line (where the two would meet if they lie in one plane) is from the end of its bend. */
export interface MitreSide {
  readonly frame: HingeFrame;
  readonly reference: number;
  readonly edgeLength: number;
}

/** Sines and squared lengths under this are nothing: planes less than a thousandth apart count as one. */
const NOTHING = 1e-6;
/** A mitre flatter than this against an edge (3 degrees) is none. */
const LEAST_SLOPE = 0.05;

/**
 * Where two flanges have to end so that they stand `gap` apart: each keeps half of it from the plane that halves the angle
 * between them, with the surface that comes nearest. `first` ends at the corner, `second` begins there. Null when they
 * turn away from one another or pass over one another.
 */
export function mitreLines(first: MitreSide, second: MitreSide, thickness: number, gap: number): { readonly first: SideLine; readonly second: SideLine } | null {
  const plane = mitrePlane(first, second, thickness, gap);
  if (!plane) return null;
  const turned = dot(plane.normal, first.frame.along) > 0 ? -1 : 1;
  const lines = [
    sideLine(first.frame, scaled(plane.normal, turned), plane.height * turned, thickness, gap, -1),
    sideLine(second.frame, scaled(plane.normal, -turned), -plane.height * turned, thickness, gap, 1),
  ] as const;
  return lines[0] && lines[1] ? { first: lines[0], second: lines[1] } : null;
}

/** The plane p . normal = height. */
function mitrePlane(first: MitreSide, second: MitreSide, thickness: number, gap: number): { readonly normal: Vec3; readonly height: number } | null {
  const [a, b] = [first.frame, second.frame];
  const across = minus(a.normal, b.normal);
  if (dot(across, across) > NOTHING) {
    const length = Math.sqrt(dot(across, across));
    return { normal: scaled(across, 1 / length), height: (dot(a.normal, a.origin) - dot(b.normal, b.origin)) / length };
  }
  // In one plane, or in two planes one over the other.
  if (Math.abs(dot(minus(b.origin, a.origin), a.normal)) >= thickness + gap) return null;
  const away = minus(a.away, b.away);
  const flat = dot(away, away) > NOTHING ? away : a.along;
  const normal = scaled(flat, 1 / Math.sqrt(dot(flat, flat)));
  return { normal, height: dot(normal, meeting(first, second)) };
}

/** Where the reference lines meet; at the end of the first edge when the two are one line. */
function meeting(first: MitreSide, second: MitreSide): Vec3 {
  const [a, b] = [first.frame, second.frame];
  const p = plus(a.origin, scaled(a.away, first.reference));
  const q = plus(b.origin, scaled(b.away, second.reference));
  const slope = dot(a.along, b.away);
  const along = Math.abs(slope) < NOTHING ? first.edgeLength : dot(minus(q, p), b.away) / slope;
  return plus(p, scaled(a.along, along));
}

function sideLine(frame: HingeFrame, normal: Vec3, height: number, thickness: number, gap: number, way: 1 | -1): SideLine | null {
  const slope = dot(normal, frame.along);
  if (slope * way < LEAST_SLOPE) return null;
  const clear = dot(normal, frame.origin) - height - gap / 2 + Math.min(0, thickness * dot(normal, frame.normal));
  return { at: -clear / slope, lean: -dot(normal, frame.away) / slope };
}

const dot = (a: Vec3, b: Vec3) => a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
const scaled = (a: Vec3, s: number): Vec3 => [a[0] * s, a[1] * s, a[2] * s];
const plus = (a: Vec3, b: Vec3): Vec3 => [a[0] + b[0], a[1] + b[1], a[2] + b[2]];
const minus = (a: Vec3, b: Vec3): Vec3 => plus(a, scaled(b, -1));
