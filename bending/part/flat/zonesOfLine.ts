import type { FieldProblem } from "../../core/problem";
import { fail, ok, type Result } from "../../core/result";
import type { LengthUnit } from "../../core/units";
import { formatLength } from "../../core/formatLength";
import { chordsOfLine } from "./chordsOfLine";
import type { FlatZone } from "./flatZone";
import type { Rings } from "./ringPlace";
import { zoneCorner } from "./zoneCorner";

/** The zones along one bend line, from its start on: one for each stretch of material. */
export function zonesOfLine(rings: Rings, line: Omit<FlatZone, "chord" | "right" | "left">, units: LengthUnit): Result<readonly FlatZone[], FieldProblem> {
  const { axes, half, path } = line;
  const chords = chordsOfLine(rings, axes, path, units);
  if (!chords.ok) return chords;
  const zones: FlatZone[] = [];
  for (const chord of chords.value) {
    const corner = (atStart: boolean, side: 1 | -1) => zoneCorner(rings, axes, half, atStart ? chord.start : chord.end, atStart ? chord.end : chord.start, atStart, side);
    const [rightStart, rightEnd, leftStart, leftEnd] = [corner(true, -1), corner(false, -1), corner(true, 1), corner(false, 1)];
    if (!rightStart || !rightEnd || !leftStart || !leftEnd) {
      return fail({ path, message: `the bend line is too near the edge: the bend takes ${formatLength(half, units)} on each side of it` });
    }
    zones.push({ ...line, chord, right: [rightStart, rightEnd], left: [leftStart, leftEnd] });
  }
  return ok(zones);
}
