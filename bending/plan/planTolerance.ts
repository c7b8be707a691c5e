/**
 * How far a dimension of the folded part may miss, one part against the next, because the stops of the gauge and the angles
 * repeat only so well (machine settings `gaugeRepeat`, `angleRepeat`). Lengths in the document's units.
 */
export interface PlanTolerance {
  /** A face's length from a bend to the opposite bend or edge, a hole's distance from a bend, or a size over all. */
  readonly kind: "leg" | "hole" | "overall";
  /** The face in which, or from which, it is measured. */
  readonly face: string;
  /** A bend's outside by the bend's name, an "edge 2" of the face, a "hole", or the face at which a size over all ends. */
  readonly from: string;
  readonly to: string;
  /** Of a size over all: square to the face instead of in it. */
  readonly across?: true;
  readonly nominal: number;
  /** Plus and minus with every error at its end; null when a step that it hangs on finds nothing to gauge from. */
  readonly worstCase: number | null;
  /** Plus and minus for about 95 of 100 parts. */
  readonly statistical: number | null;
  /** Plus and minus that the part document asks for; absent when it asks nothing. */
  readonly asked?: number;
  /** What each step brings in, plus and minus; steps count from 1. */
  readonly shares: readonly { readonly step: number; readonly gauge: number; readonly angle: number }[];
}
