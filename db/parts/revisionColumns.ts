import type { NewRevision } from "./newRevision";

export const revisionColumns = (partId: string, number: number, revision: NewRevision): Readonly<Record<string, unknown>> => ({
  part_id: partId,
  revision: number,
  name: revision.name,
  material_id: revision.materialId,
  thickness_mm: revision.thicknessMm,
  flat_width_mm: revision.flatWidthMm,
  flat_depth_mm: revision.flatDepthMm,
  bends: revision.bends,
  document: JSON.stringify(revision.document),
  note: revision.note,
  created_by: revision.by,
});
