import type { z } from "zod";
import { FORCE_FACTORS } from "./settingSubjects";
import { defaultMethodFactors, DEFAULT_FACTORS_SOURCE } from "@/bending/handbook/forceMethods";
import { database } from "@/db/client";
import { findSetting } from "@/db/settings/findSetting";
import type { ShopSettingsView, updateForceSettingsSchema } from "@/lib/schemas/shopSettings";

/** The shop's own factors, or the defaults with their source. */
export async function getShopSettings(): Promise<ShopSettingsView> {
  const row = await findSetting(database(), FORCE_FACTORS);
  const own = (row?.value ?? null) as z.output<typeof updateForceSettingsSchema>["forceFactors"];
  return {
    forceFactors: own === null ? defaultMethodFactors : { air: own.air, bottoming: own.bottoming, coining: own.coining },
    forceSource: own?.source ?? DEFAULT_FACTORS_SOURCE,
    forceIsDefault: own === null,
    forceVersion: row?.version ?? 0,
    forceChangedAt: row?.updated_at.toISOString() ?? null,
    forceChangedBy: row?.updated_by ?? "",
  };
}
