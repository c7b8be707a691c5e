import { ImportStep } from "@/components/parts/importStep/ImportStep";
import { requirePage } from "@/lib/auth/requirePage";

export const metadata = { title: "Import a STEP file" };

export default async function ImportStepPage() {
  await requirePage("/parts/import-step");
  return <ImportStep />;
}
