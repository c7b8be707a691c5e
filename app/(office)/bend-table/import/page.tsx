import { TrialImport } from "@/components/bendTable/TrialImport";
import { requirePage } from "@/lib/auth/requirePage";

export const metadata = { title: "Import trials" };

export default async function ImportTrialsPage() {
  await requirePage("/bend-table/import");
  return <TrialImport />;
}
