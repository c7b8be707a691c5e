import { MaterialList } from "@/components/materials/MaterialList";
import { can } from "@/lib/auth/permissions";
import { requirePage } from "@/lib/auth/requirePage";

export const metadata = { title: "Materials" };

export default async function MaterialsPage() {
  const { role } = await requirePage("/materials");
  return <MaterialList mayWrite={can(role, "materials:write")} />;
}
