/**
 * Every tolerance of the library, named, with its unit and reason. A doubtful contact is a collision.
 */

/** mm. Two points closer than this are one point: far under what a brake can hold, far over rounding noise. */
export const SAME_POINT_MM = 1e-6;

/** mm. Depth under which a meant contact (wing on die shoulder, punch tip in the bend) is not a collision. */
export const MEANT_CONTACT_MM = 0.05;

/** mm. Farthest that a chord may stand off the arc that it replaces (bulged edges, round holes). */
export const ARC_CHORD_MM = 0.02;

/** mm. Default clearance margin between part and tools: common practice, no source. */
export const CLEARANCE_MARGIN_MM = 1;

/** Area under which a polygon counts as empty, mm². */
export const EMPTY_AREA_MM2 = 1e-6;
