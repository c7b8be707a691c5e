import { mm, type KiloNewtonPerMetre, type Mm } from "../core/units";
import { airBendForce, FORCE_V_RANGE } from "../handbook/airBendForce";
import { hemSteps } from "../handbook/hemSteps";
import { vOpeningRule } from "../handbook/vOpeningRule";
import type { PartModel } from "../part/partModel";
import type { DieLimit, PunchLimit, ShopLimits } from "./shopLimits";

/** Degrees. Angles this near are the same to a tool. */
const SAME_ANGLE_DEG = 0.05;

/** A V that a bend can be made over. */
export interface BendingV {
  /** Null for the usual V of the thickness, when no shop is known. */
  readonly die: string | null;
  readonly vOpening: Mm;
  readonly shoulderRadius: Mm;
  readonly force: KiloNewtonPerMetre;
}

export interface BendTools {
  /** The V that is usual for the thickness. */
  readonly usual: Mm;
  /** Dies whose V suits the thickness at all, narrowest first. */
  readonly suiting: readonly DieLimit[];
  /** Those that together with some punch go as sharp as the bend needs. */
  readonly sharpEnough: readonly DieLimit[];
  /** Those that bear the force as well, with a punch that does: what the bend can be made over. Without a shop, the usual V alone. */
  readonly fitting: readonly BendingV[];
  /** Of `fitting`, the one nearest to the usual V. */
  readonly nearest: BendingV | null;
}

/**
 * Which of the shop's tools could make a bend that is taken to `demanded` degrees, apart from order, room and pieces: the V is
 * 5 to 20 times the thickness (where the force formula holds), die and punch are as sharp as the bend is closed, and both bear the force.
 * Without a shop the sharpest bend is the acute one before a hem.
 */
export function bendTools(part: PartModel, demanded: number, shop: ShopLimits | null): BendTools {
  const usual = vOpeningRule(part.thickness);
  const force = (vOpening: Mm) => airBendForce(part.material.tensile[1], part.thickness, vOpening);
  if (!shop) {
    if (demanded > 180 - hemSteps(part.thickness).preBendOpening[0]) return { usual, suiting: [], sharpEnough: [], fitting: [], nearest: null };
    const only: BendingV = { die: null, vOpening: usual, shoulderRadius: mm(0), force: force(usual) };
    return { usual, suiting: [], sharpEnough: [], fitting: [only], nearest: only };
  }
  const suiting = shop.dies.filter(({ vOpening }) => suits(vOpening, part.thickness)).sort((a, b) => a.vOpening - b.vOpening);
  const included = 180 - demanded + SAME_ANGLE_DEG;
  const punches = shop.punches.filter(({ tipAngle }) => tipAngle <= included);
  const sharpEnough = punches.length === 0 ? [] : suiting.filter(({ vAngle }) => vAngle <= included);
  const fitting = sharpEnough.filter((die) => bears(die, punches, force(die.vOpening)))
    .map((die): BendingV => ({ die: die.id, vOpening: die.vOpening, shoulderRadius: die.shoulderRadius, force: force(die.vOpening) }));
  return { usual, suiting, sharpEnough, fitting, nearest: nearestTo(usual, fitting) };
}

const suits = (vOpening: number, thickness: number) => vOpening >= FORCE_V_RANGE[0] * thickness - 1e-9 && vOpening <= FORCE_V_RANGE[1] * thickness + 1e-9;

const bears = (die: DieLimit, punches: readonly PunchLimit[], force: number) =>
  die.maxForcePerMetre >= force && punches.some(({ maxForcePerMetre }) => maxForcePerMetre >= force);

/** By ratio: 6 for 12 is as far off as 24. */
function nearestTo<T extends { readonly vOpening: number }>(usual: number, of: readonly T[]): T | null {
  const off = (one: T) => Math.abs(Math.log(one.vOpening / usual));
  return of.reduce<T | null>((best, one) => (best === null || off(one) < off(best) ? one : best), null);
}
