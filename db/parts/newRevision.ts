import type { PartDocument } from "@/bending/part/partDocument";

/** A revision to be stored: the document, and what of it is searched. */
export interface NewRevision {
  readonly document: PartDocument;
  readonly name: string;
  readonly materialId: string;
  readonly thicknessMm: number;
  readonly flatWidthMm: number;
  readonly flatDepthMm: number;
  readonly bends: number;
  readonly note: string;
  /** The user, null for what came with the installation. */
  readonly by: string | null;
}
