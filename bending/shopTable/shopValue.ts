import { mm, toDeg, type Mm } from "../core/units";
import { angleClass } from "./angleClass";
import { between, type Along } from "./between";
import { pooled } from "./pooled";
import type { ShopQuestion, ShopValue } from "./shopAnswer";
import type { ShopCell, ShopTable } from "./shopCell";
import type { ShopPoint } from "./shopPoint";
import { COVERAGE } from "./uncertain";

/** Sizes within this part of each other are one. 2 mm sheet and 14 ga stay two, 1.9 mm and 14 ga are one. */
const SAME_THICKNESS = 0.02;
const SAME_OPENING = 0.01;
const SAME_PUNCH_MM = 0.011;
/** How far apart two neighbours may lie for a value to be taken between them. Own choice: the next sizes of usual rows, with one left out. */
const THICKNESS_REACH = 2;
const OPENING_REACH = 2;
const ANGLE_REACH_DEG = 60;

/**
 * The shop's own value for a bend: of the trials of just this place, else between the neighbouring places of the angle, then of the V, then
 * of the thickness. Never beyond the outermost neighbour. Undefined when the shop has measured nothing near enough.
 *
 * Between neighbours K and the inside radius go in proportion (for a V or thickness between two, the deduction does then as well: it is
 * linear in both). K is near to the same at every angle and size, has no turn at 90 degrees and no unit; a deduction has all three.
 */
export function shopValue(table: ShopTable, question: ShopQuestion): ShopValue | undefined {
  const cells = table.cells.filter((cell) => cell.material === question.material && cell.value !== null && suitsPunch(cell, question.punchRadius));
  const angle = toDeg(question.angle);
  const atAngle: Along = { at: angle, reach: (low, high) => high - low <= ANGLE_REACH_DEG, same: (value) => value === angleClass(angle) };
  const atOpening: Along = { at: question.vOpening, reach: (low, high) => high <= OPENING_REACH * low, same: near(question.vOpening, SAME_OPENING) };
  const atThickness: Along = { at: question.thickness, reach: (low, high) => high <= THICKNESS_REACH * low, same: near(question.thickness, SAME_THICKNESS) };
  const found = between(cells, ({ thickness }) => thickness, atThickness, question, (ofThickness) =>
    between(ofThickness, ({ vOpening }) => vOpening, atOpening, question, (ofOpening) =>
      between(ofOpening, ({ angle: middle }) => middle, atAngle, question, (here) => pooled(here, question))));
  return found && valueOf(found, question);
}

const near = (asked: number, part: number) => (value: number): boolean => Math.abs(value - asked) <= part * asked;

function suitsPunch(cell: ShopCell, punchRadius: Mm | undefined): boolean {
  if (punchRadius === undefined) return cell.followsDie;
  const same = Math.abs(cell.punchRadius - punchRadius) <= SAME_PUNCH_MM;
  return same || (cell.followsDie && punchRadius <= cell.radius);
}

function valueOf(point: ShopPoint, { vOpening }: ShopQuestion): ShopValue {
  const standard = Math.sqrt(point.variance);
  return {
    interpolated: point.places.length > 1,
    deduction: point.deduction,
    standard: mm(standard),
    expanded: mm(COVERAGE * standard),
    k: point.k,
    radius: point.radius,
    count: point.places.reduce((sum, { count }) => sum + count, 0),
    spread: point.spread,
    lastMeasured: point.places.reduce((last, place) => (place.lastMeasured > last ? place.lastMeasured : last), ""),
    vOpening,
    places: point.places,
  };
}
