// The only door to bending/ from outside.
export * from "./core/units";
export * from "./core/result";
export * from "./core/problem";
export * from "./core/tolerance";
export { invariant } from "./core/invariant";

export type { Vec2, FlatPoint, ProfilePoint } from "./geometry/vec2";
export type { Vec3, PartPoint, MachinePoint } from "./geometry/vec3";
export type { Frame } from "./geometry/frame";
export type { Interval } from "./geometry/interval";
export { applyFrame } from "./geometry/applyFrame";
export { composeFrames } from "./geometry/composeFrames";
export { identityFrame } from "./geometry/identityFrame";
export { invertFrame } from "./geometry/invertFrame";
export { convexPieces } from "./geometry/convexPieces";
export { selfCrossing } from "./geometry/selfCrossing";
export { polygonBounds, type Bounds2 } from "./geometry/polygonBounds";
export { polygonCentroid } from "./geometry/polygonCentroid";
export { polygonContains } from "./geometry/polygonContains";
export { signedArea } from "./geometry/signedArea";

export type { MaterialFacts, MaterialGroup, MaterialLookup, MinimumRadius } from "./handbook/material";
export { builtInMaterials, materialById } from "./handbook/materials";
export { bendAllowance } from "./handbook/bendAllowance";
export { bendDeduction } from "./handbook/bendDeduction";
export { outsideSetback } from "./handbook/outsideSetback";
export { kFactorFromDeduction } from "./handbook/kFactorFromDeduction";
export { resolveAllowance, type AllowanceQuestion, type ResolvedAllowance } from "./handbook/resolveAllowance";

export type * from "./part/partDocument";
export type * from "./part/partModel";
export { PART_LIMITS } from "./part/partLimits";
export { readPartDocument } from "./part/readPartDocument";
export { buildPart, type BuildPartOptions } from "./part/buildPart";
export { documentInUnits } from "./part/documentInUnits";
export { formatLength } from "./part/formatLength";
export { foldFrames } from "./part/foldFrames";
export { foldPoint } from "./part/foldPoint";
export { unfoldPoint } from "./part/unfoldPoint";
export { bendFacets, type BendFacet, type FacetQuad } from "./part/bendFacets";
export { flatPattern, type FlatPattern, type FlatBendLine } from "./part/flatPattern";
