import { MaterialImport } from "@/components/materials/MaterialImport";
import { requirePage } from "@/lib/auth/requirePage";

export const metadata = { title: "Import materials" };

export default async function ImportMaterialsPage() {
  await requirePage("/materials/import");
  return <MaterialImport />;
}
