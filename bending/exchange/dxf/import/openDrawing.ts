import { ok, type Result } from "../../../core/result";
import type { DxfNote } from "../read/dxfDrawing";
import { readDxf } from "../read/readDxf";
import { placeShapes } from "../shape/placeShapes";
import type { PlacedShape } from "../shape/placedShape";
import { decideUnits, type UnitDecision } from "./decideUnits";
import { guessRoles } from "./guessRoles";
import type { LineGroup, LineRole } from "./lineGroup";
import { lineGroups } from "./lineGroups";

/** A drawing file read, with proposals for what a person may choose. Plain data: it travels between threads. */
export interface OpenedDrawing {
  readonly shapes: readonly PlacedShape[];
  readonly groups: readonly LineGroup[];
  readonly units: UnitDecision;
  readonly roles: ReadonlyMap<string, LineRole>;
  readonly texts: readonly string[];
  readonly notes: readonly DxfNote[];
  readonly moreNotes: number;
}

/** Reads the text of a DXF file; a failure says on which line and what was expected. */
export function openDrawing(text: string): Result<OpenedDrawing, string> {
  const read = readDxf(text);
  if (!read.ok) return read;
  const placed = placeShapes(read.value);
  if (!placed.ok) return placed;
  const groups = lineGroups(placed.value.shapes);
  return ok({
    shapes: placed.value.shapes, groups, units: decideUnits(read.value.header, placed.value), roles: guessRoles(groups), texts: placed.value.texts,
    notes: [...read.value.notes, ...placed.value.notes], moreNotes: read.value.moreNotes,
  });
}
