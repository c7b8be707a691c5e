import type { FieldProblem } from "../../core/problem";
import { fail, ok, type Result } from "../../core/result";
import type { LengthUnit } from "../../core/units";
import type { EdgeAxes } from "../edgeCut";
import { formatLength } from "../../core/formatLength";
import { materialChords, type MaterialChord } from "./materialChords";
import type { Rings } from "./ringPlace";

/** Drawings often end a bend line short of the sheet's edge; it must cover this part of the sheet, so that no tab is meant. */
const LEAST_COVER = 0.8;
/** Less than this is a line drawn on over a gap a little too far. */
const TOUCH_COVER = 0.2;

/** The stretches of material that a bend line bends; a line over a notch or a window bends on both sides of it. */
export function chordsOfLine(rings: Rings, axes: EdgeAxes, path: string, units: LengthUnit): Result<readonly MaterialChord[], FieldProblem> {
  const chords = materialChords(rings, axes).map((chord) => ({ chord, covered: cover(chord, axes.length) })).filter(({ covered }) => covered > 0);
  const meant = chords.filter(({ covered }) => covered >= LEAST_COVER);
  const half = chords.find(({ covered }) => covered < LEAST_COVER && (covered > TOUCH_COVER || meant.length === 0));
  if (half) {
    return fail({ path, message: `the bend line must run from edge to edge: it is ${formatLength(axes.length, units)} long, the sheet along it ${formatLength(half.chord.to - half.chord.from, units)}` });
  }
  return meant.length > 0 ? ok(meant.map(({ chord }) => chord)) : fail({ path, message: "the bend line must lie on the sheet" });
}

function cover({ from, to }: MaterialChord, length: number): number {
  return (Math.min(to, length) - Math.max(from, 0)) / (to - from);
}
