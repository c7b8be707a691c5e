import type { z } from "zod";
import { recordEvent } from "../recordEvent";
import { getShopSettings } from "./getShopSettings";
import { FORCE_FACTORS } from "./settingSubjects";
import { fail, ok, type Result } from "@/bending/core/result";
import { database } from "@/db/client";
import { saveSetting } from "@/db/settings/saveSetting";
import type { Failure } from "@/lib/api/failure";
import type { SignedInPerson } from "@/lib/auth/signedInPerson";
import type { ShopSettingsView, updateForceSettingsSchema } from "@/lib/schemas/shopSettings";

/** The shop's own force factors, or the defaults again; refused when somebody else changed them meanwhile. */
export async function updateForceSettings(person: SignedInPerson, { basedOn, forceFactors }: z.output<typeof updateForceSettingsSchema>): Promise<Result<ShopSettingsView, Failure>> {
  const saved = await database().transaction(async (within) => {
    const done = await saveSetting(within, FORCE_FACTORS, basedOn, forceFactors, person.id);
    const words = forceFactors === null ? "the defaults again" : `air ${forceFactors.air}, bottoming ${forceFactors.bottoming}, coining ${forceFactors.coining}; ${forceFactors.source}`;
    if (done) await recordEvent(within, person, "changed the shop's settings", "force factors", words);
    return done;
  });
  return saved ? ok(await getShopSettings()) : fail({ kind: "conflict", message: "Somebody else changed the factors meanwhile. Nothing was saved; what you entered is still here. Look at theirs first." });
}
