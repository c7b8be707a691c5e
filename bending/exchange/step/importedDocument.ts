import type { MaterialLookup } from "../../handbook/material";
import { buildPart, type BuildPartOptions } from "../../part/buildPart";
import type { PartDocument } from "../../part/partDocument";
import type { ImportChoices } from "./importChoices";
import type { RecognisedPart } from "./recognisedPart";
import { toPartDocument } from "./toPartDocument";

/**
 * A recognised part as a document, with its cut-outs across bends: those are drawn in the flat, so they are laid out with the allowances
 * that the bends have by the chosen material and rule.
 */
export function importedDocument(part: RecognisedPart, choices: ImportChoices, options: BuildPartOptions & { readonly materials: MaterialLookup }): PartDocument {
  const closed = toPartDocument(part, choices);
  if (part.bends.every(({ windows }) => windows.length === 0)) return closed;
  const built = buildPart(closed, options);
  return built.ok ? toPartDocument(part, choices, built.value.bends.map(({ allowance }) => allowance)) : closed;
}
