import { route } from "@/lib/api/route";
import { judgeTrialSchema } from "@/lib/schemas/bendTableInputs";
import { idParams } from "@/lib/schemas/idParams";
import { judgeTrial } from "@/lib/services/bendTable/judgeTrial";

export const PATCH = route("PATCH /api/bend-table/trials/[id]", {
  params: idParams,
  body: judgeTrialSchema,
  run: ({ person, params, body }) => judgeTrial(person, params.id, body),
});
