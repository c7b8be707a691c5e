import { z } from "zod";
import type { MethodFactors } from "@/bending/handbook/forceMethods";
import { filledText } from "./plainText";

const factor = z.number({ error: "must be a number" });

export const updateForceSettingsSchema = z.strictObject({
  basedOn: z.number({ error: "must be the number of the version that was changed" }).int("must be a whole number").min(0, "must be 0 or more").max(2_147_483_646),
  /** Null: the defaults again. */
  forceFactors: z.strictObject({
    air: factor.min(0.5, "must be 0.5 to 2").max(2, "must be 0.5 to 2"),
    bottoming: factor.min(1, "must be 1 to 20").max(20, "must be 1 to 20"),
    coining: factor.min(1, "must be 1 to 50").max(50, "must be 1 to 50"),
    source: filledText(300),
  }).refine(({ bottoming, air }) => bottoming >= air, { path: ["bottoming"], error: "must be at least the factor of air bending" })
    .refine(({ coining, bottoming }) => coining >= bottoming, { path: ["coining"], error: "must be at least the factor of bottoming" })
    .nullable(),
});

export interface UpdateForceSettingsInput {
  /** The version that was changed; 0: the defaults that nobody has changed yet. */
  readonly basedOn: number;
  readonly forceFactors: (MethodFactors & { readonly source: string }) | null;
}

/** The shop's own settings, or the defaults where it has none. */
export interface ShopSettingsView {
  /** What the air-bend force of the formula is multiplied by. */
  readonly forceFactors: MethodFactors;
  readonly forceSource: string;
  readonly forceIsDefault: boolean;
  readonly forceVersion: number;
  readonly forceChangedAt: string | null;
  readonly forceChangedBy: string;
}
