import { deg, kiloNewton, kiloNewtonPerMetre, mm } from "../../core/units";
import type { DieLimit, ShopLimits } from "../shopLimits";
import { stockSheets } from "../stockSheets";

export const trialDie = (vOpening: number, shoulderRadius: number, vAngle = 86, maxForcePerMetre = 1000): DieLimit =>
  ({ id: `V${vOpening}`, vOpening: mm(vOpening), shoulderRadius: mm(shoulderRadius), vAngle: deg(vAngle), maxForcePerMetre: kiloNewtonPerMetre(maxForcePerMetre) });

/** A small shop: four dies, a usual and an acute punch, one brake. */
export const trialShop: ShopLimits = {
  dies: [trialDie(6, 0.5), trialDie(12, 1), trialDie(16, 1.5), trialDie(24, 2)],
  punches: [
    { id: "P85", tipAngle: deg(85), tipRadius: mm(0.8), maxForcePerMetre: kiloNewtonPerMetre(1000) },
    { id: "P30", tipAngle: deg(30), tipRadius: mm(0.5), maxForcePerMetre: kiloNewtonPerMetre(500) },
  ],
  machines: [{ name: "Brake", bedLength: mm(2000), betweenFrames: mm(1600), throatDepth: mm(200), maxForce: kiloNewton(600), maxUncoveredEnd: mm(5) }],
  stock: stockSheets,
  flattening: [],
};
