import type { BendDirection } from "../../../part/partDocument";
import type { DrawingUnit } from "./drawingUnit";
import type { LineRole } from "./lineGroup";

/** What a person chooses in the preview. */
export interface ImportChoices {
  readonly unit: DrawingUnit;
  /** By the key of a line group; groups left out are cut. */
  readonly roles: ReadonlyMap<string, LineRole>;
  /** Gaps up to this are closed, mm. */
  readonly gap: number;
  /** Single straight lines inside the contour that were drawn like it: bends after all, or left out. */
  readonly singleLines: BendDirection | null;
  /** Which closed contour is the sheet's edge, by index in order of area; 0 the largest. */
  readonly contour: number;
}
