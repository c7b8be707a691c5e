import type { Mm, Rad } from "../core/units";
import type { ProfilePoint } from "../geometry/vec2";
import { arcPoints } from "./arcPoints";

export interface RelievedPunchShape {
  readonly tipAngle: Rad;
  readonly tipRadius: Mm;
  /** Seat to tip. */
  readonly height: Mm;
  readonly bodyWidth: Mm;
  /** How far the relieved side stands behind the tip (x = 0). */
  readonly reliefDepth: Mm;
  /** Height over the tip up to which the relief goes straight; from there it slopes out to the body at 45 degrees. */
  readonly reliefHeight: Mm;
  /** Width of the nose at the top of the relieved side's flank, twice the distance from the tip's axis. */
  readonly noseWidth?: Mm;
  /** Thickness of the neck beside the relief. */
  readonly neckWidth?: Mm;
  /** The side that is cut away: `front` is the operator's. */
  readonly side?: "front" | "back";
}

/**
 * A punch whose body steps back behind its tip on one side, so that a flange that stands up there goes into the
 * relief. Counter-clockwise from the tip. For tips of 80 degrees and over: a sharper tip leaves the neck no room.
 */
export function relievedPunchProfile(shape: RelievedPunchShape): readonly ProfilePoint[] {
  const half = shape.tipAngle / 2;
  const nose = (shape.noseWidth ?? 8) / 2;
  const neckBack = shape.reliefDepth + (shape.neckWidth ?? 14);
  const body = shape.bodyWidth / 2;
  const flankY = (tangent: ProfilePoint, x: number): number => tangent[1] + (x - tangent[0]) / Math.tan(half);
  const arc = arcPoints([0, shape.tipRadius], shape.tipRadius, -Math.PI / 2, -half);
  const tangent = arc[arc.length - 1] ?? [0, 0];
  const noseY = flankY(tangent, nose);
  const back: readonly ProfilePoint[] = [
    ...arc,
    [neckBack, flankY(tangent, neckBack)],
    ...(neckBack < body ? ([[neckBack, shape.reliefHeight], [body, shape.reliefHeight + body - neckBack]] as const) : []),
    [Math.max(body, neckBack), shape.height],
  ];
  const front: readonly ProfilePoint[] = [
    [-body, shape.height],
    [-body, shape.reliefHeight + body + shape.reliefDepth],
    [shape.reliefDepth, shape.reliefHeight],
    [shape.reliefDepth, noseY + nose + shape.reliefDepth],
    [-nose, noseY],
    ...arc.slice(1).map(([x, y]): ProfilePoint => [-x, y]).reverse(),
  ];
  const profile: readonly ProfilePoint[] = [[0, 0], ...back.slice(1), ...front];
  if (shape.side !== "back") return profile;
  const mirrored = profile.slice(1).map(([x, y]): ProfilePoint => [-x, y]).reverse();
  return [[0, 0], ...mirrored];
}
