import type { Vec2 } from "../../../geometry/vec2";
import { polygonBounds } from "../../../geometry/polygonBounds";
import type { DxfHeader } from "../read/dxfDrawing";
import type { PlacedDrawing } from "../shape/placedShape";
import { drawingUnitName, mmPerDrawingUnit, unitOfHeader, type DrawingUnit } from "./drawingUnit";
import { shapeMeasures } from "./shapeMeasures";

export interface UnitDecision {
  readonly unit: DrawingUnit;
  /** False: a person should say whether it is right. */
  readonly sure: boolean;
  /** What the header says, when it says anything. */
  readonly header: DrawingUnit | null;
  /** Why, sentence by sentence. */
  readonly reasons: readonly string[];
}

/**
 * Points of evidence, common practice without a source: the header counts most, but not against the size of the blank (stock sheets are up
 * to about 3 x 1.5 m and a press brake's blank is seldom under 25 mm) together with the size of holes and corner radii (a middle one
 * of 0.4 to 40 mm).
 */
const SURE_MARGIN = 2;

/** In which unit the drawing is meant, the header believed only where the sizes agree. */
export function decideUnits(header: DxfHeader, drawing: PlacedDrawing): UnitDecision {
  const said = header.units === null ? null : (unitOfHeader[header.units] ?? null);
  const { points, radii } = shapeMeasures(drawing.shapes.filter((shape) => !shape.hidden));
  const size = points.length === 0 ? 0 : sizeOf(points);
  const middle = [...radii].sort((a, b) => a - b)[Math.floor(radii.length / 2)];
  const candidates: readonly DrawingUnit[] = [...new Set<DrawingUnit>([...(said ? [said] : []), "mm", "in"])];
  const judged = candidates.map((unit) => judge(unit, said, header.measurement, size, middle, drawing.texts)).sort((a, b) => b.points - a.points);
  const [best, next] = judged;
  const unit = best?.unit ?? "mm";
  const other = said !== null && said !== unit ? judged.find((one) => one.unit === said) : undefined;
  return {
    unit,
    header: said,
    sure: said === unit && (best?.points ?? 0) - (next?.points ?? -Infinity) >= SURE_MARGIN,
    reasons: [
      said === null ? "The file does not say its unit." : `The header says ${drawingUnitName[said]}.`,
      ...(other?.against.map((reason) => `In ${drawingUnitName[other.unit]} ${reason}.`) ?? []),
      ...(best?.against.map((reason) => `In ${drawingUnitName[unit]} ${reason}.`) ?? []),
      ...(best?.for.map((reason) => `In ${drawingUnitName[unit]} ${reason}.`) ?? []),
    ],
  };
}

interface Judged { readonly unit: DrawingUnit; readonly points: number; readonly for: readonly string[]; readonly against: readonly string[] }

function judge(unit: DrawingUnit, said: DrawingUnit | null, measurement: number | null, size: number, middle: number | undefined, texts: readonly string[]): Judged {
  const factor = mmPerDrawingUnit[unit];
  const metric = unit !== "in" && unit !== "ft";
  const [long, radius] = [size * factor, middle === undefined ? null : middle * factor];
  const good: string[] = [];
  const bad: string[] = [];
  let points = unit === said ? 3 : 0;
  // Only the fallback of files that say nothing better: many metric files carry the other value.
  if (measurement !== null && (measurement === 1) === metric) points += said === null ? 1 : 0.25;
  const word = texts.some((text) => (metric ? /\b(mm|millimet)/i : /\b(inch(es)?)\b|\d"/i).test(text));
  if (word) { points += 1; good.push(`the drawing's text agrees`); }
  const sizeText = `the blank is ${round(long)} mm long`;
  if (long > 8000 || long < 8) { points -= 4; bad.push(`${sizeText}, which no press brake part is`); }
  else if (long > 3200 || long < 25) { points -= long > 3200 ? 3.5 : 2; bad.push(`${sizeText}, which few parts are`); }
  else good.push(sizeText);
  if (radius !== null) {
    const text = `a middle-sized hole or corner has a radius of ${round(radius)} mm`;
    if (radius > 40 || radius < 0.4) { points -= 3; bad.push(`${text}, which is unusual`); }
    else { points += 0.5; good.push(text); }
  }
  return { unit, points, for: good, against: bad };
}

function sizeOf(points: readonly Vec2[]): number {
  const { min, max } = polygonBounds(points);
  return Math.max(max[0] - min[0], max[1] - min[1]);
}

const round = (value: number): string => String(Number(value.toPrecision(3)));
