import type { KiloNewtonPerMetre, Mm, Rad } from "../core/units";

/** Why a tool does not do for a machine or a bend, with the numbers that a person needs to choose better. */
export type ToolMisfit =
  | { readonly kind: "tang"; readonly tool: string; readonly has: string; readonly wanted: string }
  /** The V is outside what air bending of this thickness allows. */
  | { readonly kind: "v-opening"; readonly tool: string; readonly has: Mm; readonly from: Mm; readonly to: Mm; readonly usual: Mm }
  /** The V gives another inside radius than the one asked for. */
  | { readonly kind: "radius"; readonly tool: string; readonly gives: Mm; readonly wanted: Mm; readonly allowance: Mm }
  /** The V's walls stop the sheet before the included angle under load. */
  | { readonly kind: "die-angle"; readonly tool: string; readonly has: Rad; readonly most: Rad }
  | { readonly kind: "punch-angle"; readonly tool: string; readonly has: Rad; readonly most: Rad }
  | { readonly kind: "tip-radius"; readonly tool: string; readonly has: Mm; readonly most: Mm }
  | { readonly kind: "force"; readonly tool: string; readonly needs: KiloNewtonPerMetre; readonly rating: KiloNewtonPerMetre }
  /** The flange leaves the shoulder before the bend is made. */
  | { readonly kind: "flange"; readonly tool: string; readonly has: Mm; readonly least: Mm };
