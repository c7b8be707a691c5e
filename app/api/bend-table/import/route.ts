import { route } from "@/lib/api/route";
import { csvImportSchema } from "@/lib/schemas/csvImport";
import { importTrials } from "@/lib/services/bendTable/importTrials";

export const POST = route("POST /api/bend-table/import", {
  body: csvImportSchema,
  bodyLimit: 5_000_000,
  run: ({ person, body }) => importTrials(person, body),
});
