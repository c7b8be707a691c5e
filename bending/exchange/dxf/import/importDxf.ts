import { DRAWN_GAP_MM } from "../../../core/tolerance";
import { fail, ok, type Result } from "../../../core/result";
import type { BendDirection, PartDocument } from "../../../part/partDocument";
import type { DrawingUnit } from "./drawingUnit";
import { findFlat } from "./findFlat";
import { flatDocument, type FlatFacts } from "./flatDocument";
import type { FoundFlat } from "./foundFlat";
import type { LineRole } from "./lineGroup";
import { openDrawing, type OpenedDrawing } from "./openDrawing";

export interface ImportDxfOptions extends Omit<FlatFacts, "units"> {
  /** Absent: decided by the header and what is plausible. */
  readonly unit?: DrawingUnit | undefined;
  /** Role of a layer; absent: guessed by its name, colour and line type. */
  readonly layers?: ReadonlyMap<string, LineRole> | undefined;
  readonly gap?: number | undefined;
  readonly singleLines?: BendDirection | null | undefined;
}

export interface ImportedDxf {
  readonly opened: OpenedDrawing;
  readonly unit: DrawingUnit;
  /** What each line group was taken for. */
  readonly roles: ReadonlyMap<string, LineRole>;
  readonly found: FoundFlat;
  /** Not yet checked. */
  readonly document: PartDocument;
}

/** A DXF file to a part document in one go, everything that a person could choose taken as guessed unless it is given. */
export function importDxf(text: string, options: ImportDxfOptions): Result<ImportedDxf, string> {
  const opened = openDrawing(text);
  if (!opened.ok) return opened;
  const { shapes, groups, roles, units } = opened.value;
  const { layers } = options;
  const unknown = [...(layers?.keys() ?? [])].find((name) => !groups.some(({ layer }) => layer === name));
  if (unknown !== undefined) return fail(`the file has no lines on a layer "${unknown}"; it has ${[...new Set(groups.map(({ layer }) => layer))].join(", ") || "none"}`);
  const unit = options.unit ?? units.unit;
  const chosen = new Map(groups.map((group) => [group.key, layers?.get(group.layer) ?? roles.get(group.key) ?? "cut"] as const));
  const found = findFlat(shapes, groups, { unit, roles: chosen, gap: options.gap ?? DRAWN_GAP_MM, singleLines: options.singleLines ?? null, contour: 0 });
  const document = flatDocument(found, { ...options, units: unit === "in" || unit === "ft" ? "in" : "mm" });
  if (!document) return fail(`no closed contour was found${found.leftovers[0] ? `: ${found.leftovers[0].what}` : ""}${found.leftovers.length > 1 ? ` (and ${found.leftovers.length - 1} more)` : ""}`);
  return ok({ opened: opened.value, unit, roles: chosen, found, document });
}
