import type { FieldProblem } from "@/bending/core/problem";
import { buildPart } from "@/bending/part/buildPart";
import { flatPattern, type FlatPattern } from "@/bending/part/flatPattern";
import type { PartDocument } from "@/bending/part/partDocument";
import type { PartModel } from "@/bending/part/partModel";
import { readPartDocument } from "@/bending/part/readPartDocument";
import type { MaterialFacts } from "@/bending/handbook/material";
import type { ShopTable } from "@/bending/shopTable/shopCell";
import { documentFromDraft } from "../draft/documentFromDraft";
import type { PartDraft } from "../draft/partDraft";

export interface PreviewModel { readonly document: PartDocument; readonly part: PartModel; readonly flat: FlatPattern }

export interface Preview {
  /** Null while the part cannot be built. */
  readonly model: PreviewModel | null;
  readonly problems: readonly FieldProblem[];
}

/** From what was typed to the part, its flat and every problem found on the way. A part without a name is drawn all the same. */
export function computePreview(draft: PartDraft, materials: readonly MaterialFacts[], shopTable?: ShopTable): Preview {
  if (draft.name.trim() !== "") return build(draft, materials, shopTable);
  const { model, problems } = build({ ...draft, name: "-" }, materials, shopTable);
  return { model, problems: [{ path: "name", message: "Give the part a name." }, ...problems] };
}

function build(draft: PartDraft, materials: readonly MaterialFacts[], shopTable: ShopTable | undefined): Preview {
  const byId = (id: string) => materials.find((material) => material.id === id);
  const typed = documentFromDraft(draft, byId(draft.material)?.group);
  if (typed.problems.length > 0) return { model: null, problems: typed.problems };
  const read = readPartDocument(typed.document);
  if (!read.ok) return { model: null, problems: read.error };
  const built = buildPart(read.value, { materials: byId, shopTable });
  // A flat that overlaps is drawn all the same, so that it is seen where; it is not saved.
  const drawn = built.ok ? built : buildPart(read.value, { materials: byId, shopTable, keepOverlaps: true });
  if (!drawn.ok) return { model: null, problems: drawn.error };
  return { model: { document: read.value, part: drawn.value, flat: flatPattern(drawn.value) }, problems: built.ok ? [] : built.error };
}
