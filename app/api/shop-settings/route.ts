import { ok } from "@/bending/core/result";
import { route } from "@/lib/api/route";
import { updateForceSettingsSchema } from "@/lib/schemas/shopSettings";
import { getShopSettings } from "@/lib/services/settings/getShopSettings";
import { updateForceSettings } from "@/lib/services/settings/updateForceSettings";

export const GET = route("GET /api/shop-settings", { run: async () => ok(await getShopSettings()) });

export const PATCH = route("PATCH /api/shop-settings", {
  body: updateForceSettingsSchema,
  run: ({ person, body }) => updateForceSettings(person, body),
});
