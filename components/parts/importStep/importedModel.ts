import type { FieldProblem } from "@/bending/core/problem";
import { checkFolded, type FoldedCheck } from "@/bending/exchange/step/checkFolded";
import type { ImportChoices } from "@/bending/exchange/step/importChoices";
import type { RecognisedPart } from "@/bending/exchange/step/recognisedPart";
import { importedDocument } from "@/bending/exchange/step/importedDocument";
import type { MaterialFacts } from "@/bending/handbook/material";
import { buildPart } from "@/bending/part/buildPart";
import { flatPattern, type FlatPattern } from "@/bending/part/flatPattern";
import type { PartDocument } from "@/bending/part/partDocument";
import type { PartModel } from "@/bending/part/partModel";
import { readPartDocument } from "@/bending/part/readPartDocument";
import type { ShopTable } from "@/bending/shopTable/shopCell";
import { parseAngle } from "@/lib/format/parseAngle";
import { parseLength } from "@/lib/format/parseLength";
import { degreesOf, type ImportForm } from "./importForm";

export interface ImportedModel {
  readonly document: PartDocument;
  readonly part: PartModel;
  readonly flat: FlatPattern;
  readonly folded: FoldedCheck;
}

/** A typed number that differs from what was found by no more than its last written digit stands for what was found. */
const WRITTEN = 5.1e-4;

/** The document that the form stands for, with its part; and what must be mended, by the form's fields. */
export function importedModel(found: RecognisedPart, form: ImportForm, materials: readonly MaterialFacts[], shopTable: ShopTable | undefined): { readonly model: ImportedModel | null; readonly problems: readonly FieldProblem[] } {
  const byId = (id: string) => materials.find((material) => material.id === id);
  const problems: FieldProblem[] = [];
  const read = (path: string, parsed: ReturnType<typeof parseAngle>, as: number, least: number): number | undefined => {
    if (!parsed.ok) problems.push({ path, message: parsed.error });
    else if (parsed.value < least) problems.push({ path, message: `must be ${least} or more` });
    else if (Math.abs(parsed.value - as) > WRITTEN) return parsed.value;
    return undefined;
  };
  const thickness = read("thickness", parseLength(form.thickness, "mm", { gaugeGroup: byId(form.material)?.group }), found.thickness, 0.01);
  const bends = found.bends.map((bend, i) => {
    const typed = form.bends[i];
    const insideRadius = read(`bends.${i}.insideRadius`, parseLength(typed?.insideRadius ?? "", "mm"), bend.insideRadius, 0);
    const angle = read(`bends.${i}.angle`, parseAngle(typed?.angle ?? ""), degreesOf(bend.angle), 0.001);
    return { ...(insideRadius === undefined ? {} : { insideRadius }), ...(angle === undefined ? {} : { angle }) };
  });
  if (form.name.trim() === "") problems.push({ path: "name", message: "Give the part a name." });
  if (problems.length > 0) return { model: null, problems };
  const choices: ImportChoices = {
    name: form.name.trim(), material: form.material, bends,
    ...(form.rule === "default" ? {} : { rule: form.rule }), ...(thickness === undefined ? {} : { thickness }),
  };
  const document = readPartDocument(importedDocument(found, choices, { materials: byId, shopTable }));
  if (!document.ok) return { model: null, problems: document.error };
  const part = buildPart(document.value, { materials: byId, shopTable });
  if (!part.ok) return { model: null, problems: part.error };
  return { model: { document: document.value, part: part.value, flat: flatPattern(part.value), folded: checkFolded(part.value, found) }, problems: [] };
}
