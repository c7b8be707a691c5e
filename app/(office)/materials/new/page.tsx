import { NewMaterial } from "@/components/materials/edit/NewMaterial";
import { requirePage } from "@/lib/auth/requirePage";

export const metadata = { title: "New material" };

export default async function NewMaterialPage() {
  await requirePage("/materials/new");
  return <NewMaterial />;
}
