import type { Vec2 } from "@/bending/geometry/vec2";

/** A free edge of the unfolded part on which a flange may stand, by the document's own count. */
export interface FaceEdge { readonly face: string; readonly edge: number; readonly line: readonly [Vec2, Vec2] }

/** What can be picked in a drawing of a part, and what picking does. */
export interface PartPicking {
  /** The face that is being worked on, drawn with dots and a heavy outline; null: none. */
  readonly picked: string | null;
  readonly onFace: (face: string) => void;
  readonly onBend: (bend: string) => void;
  readonly edges: readonly FaceEdge[];
  readonly onEdge: (edge: FaceEdge) => void;
}
