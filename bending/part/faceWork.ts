import type { Vec2 } from "../geometry/vec2";
import type { DrawnFace } from "./drawnFace";
import type { SourceFlange } from "./partSource";
import type { FlatCircle } from "./partModel";
import type { ResolvedBend } from "./resolveBend";
import type { SheetPlacement } from "./sheetPlacement";

/** A face on its way from the document into the model. */
export interface FaceWork {
  readonly id: string;
  /** Index in the model. */
  readonly index: number;
  readonly drawn: DrawnFace;
  readonly placement: SheetPlacement;
  /** The plane part, in local coordinates. */
  readonly plane: readonly Vec2[];
  /** Of round reliefs in the plane part, in local coordinates. */
  readonly reliefs: readonly FlatCircle[];
  /** Where local x = 0 lies along the edge that this chain of flanges on far edges stands on. */
  readonly alongChain: number;
}

/** A flange with its bend decided. */
export interface FlangeWork extends SourceFlange {
  readonly bend: ResolvedBend;
}
