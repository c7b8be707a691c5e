import { ImportDrawings } from "@/components/parts/import/ImportDrawings";
import { requirePage } from "@/lib/auth/requirePage";

export const metadata = { title: "Import drawings" };

export default async function ImportDrawingsPage() {
  await requirePage("/parts/import");
  return <ImportDrawings />;
}
