/**
 * How the sheet lies in the operator's hands before a stroke: which side is up, and which direction of the
 * unfolded sheet points away from the operator (radians, counter-clockwise seen from the base's top, a whole
 * number of tenths of a degree, so that equal poses compare equal).
 * Directions are compared in the unfolded sheet, formed flanges carried along.
 */
export interface Pose {
  readonly up: 1 | -1;
  readonly heading: number;
}

const STEPS_A_TURN = 3600;

/** The pose of a heading given as a direction of the unfolded sheet. */
export function poseOf(up: 1 | -1, x: number, y: number): Pose {
  const tenths = Math.round((Math.atan2(y, x) / (2 * Math.PI)) * STEPS_A_TURN);
  return { up, heading: (((tenths + STEPS_A_TURN) % STEPS_A_TURN) / STEPS_A_TURN) * 2 * Math.PI };
}
