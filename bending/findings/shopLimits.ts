import type { Deg, KiloNewton, KiloNewtonPerMetre, Mm } from "../core/units";

/** What a shop can do, as plain data: only what is in service belongs here. Lengths in mm, angles in degrees, forces in kN. */
export interface ShopLimits {
  readonly dies: readonly DieLimit[];
  readonly punches: readonly PunchLimit[];
  readonly machines: readonly MachineLimit[];
  /** Sheet sizes that the shop buys; see `stockSheets` for the usual ones. */
  readonly stock: readonly StockSheet[];
  /** Tools that flatten a hem, by name. */
  readonly flattening: readonly string[];
}

export interface DieLimit {
  readonly id: string;
  /** Between the tops of the shoulder arcs. */
  readonly vOpening: Mm;
  readonly vAngle: Deg;
  readonly shoulderRadius: Mm;
  readonly maxForcePerMetre: KiloNewtonPerMetre;
}

export interface PunchLimit {
  readonly id: string;
  readonly tipAngle: Deg;
  readonly tipRadius: Mm;
  readonly maxForcePerMetre: KiloNewtonPerMetre;
}

export interface MachineLimit {
  readonly name: string;
  readonly bedLength: Mm;
  readonly betweenFrames: Mm;
  readonly throatDepth: Mm;
  readonly maxForce: KiloNewton;
  /** How much of a bend may stand over the tools at each end. */
  readonly maxUncoveredEnd: Mm;
}

export interface StockSheet {
  readonly length: Mm;
  readonly width: Mm;
}
