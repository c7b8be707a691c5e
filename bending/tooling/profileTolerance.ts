/** mm. How far a drawn profile may stand off the numbers stated beside it: tools are drawn by hand. Common practice, no source. */
export const PROFILE_TOLERANCE_MM = 0.1;

/** Radians (1.5 degrees). How far the drawn walls of a V may differ from the stated angle. Common practice, no source. */
export const PROFILE_TOLERANCE_RAD = (1.5 * Math.PI) / 180;
