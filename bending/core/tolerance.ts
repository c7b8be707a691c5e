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

/** mm. Points, lines and distances of a solid read from a file that differ by less are the same: modellers keep 1e-3 mm or better, and a brake holds 0.05 mm at best. */
export const SOLID_MATCH_MM = 2e-3;

/** Radians. Directions of a solid read from a file that differ by less are parallel: at 1 m they are 0.2 mm apart. */
export const SOLID_PARALLEL_RAD = 2e-4;

/** mm. Points of a drawing file nearer than this are one point and no gap: many programs write three decimals. */
export const DRAWN_POINT_MM = 0.002;

/** mm. Gaps in a drawn contour up to this are closed unless another tolerance is asked for: common practice, no source; far under what a laser's cut is wide. */
export const DRAWN_GAP_MM = 0.1;

/** mm. Farthest that the arcs put in place of a drawn ellipse or spline stand off it. */
export const CURVE_FIT_MM = 0.01;

/** mm. A flat that comes out as near as this to what it was is the same flat: half of the last digit that is printed. */
export const FLAT_CHANGE_MM = 0.005;

/** mm. A drawn cut without width is opened to this, so that the sheet has two sides there: about what a laser takes away. */
export const DRAWN_SLIT_MM = 0.1;

/** mm. What a place in a written plan may be off by its rounding: a stored plan is not called wrong for less. */
export const WRITTEN_PLACE_MM = 1e-3;

/** mm. Sizes of a part that differ by less are one size: a tenth of what a back gauge repeats at best. */
export const SAME_SIZE_MM = 0.01;

/** Radians. Bend lines and edges this near to parallel are: a tenth of a degree, as at the back gauge. */
export const PARALLEL_RAD = 1.75e-3;

/** mm. Shut heights of stations on one bed must agree this well, as one ram closes them all. Common practice, no source. */
export const SAME_SHUT_HEIGHT_MM = 0.1;
