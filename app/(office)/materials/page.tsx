import { Suspense } from "react";
import { MaterialList } from "@/components/tooling/materials/MaterialList";
import { requirePage } from "@/lib/auth/requirePage";

export const metadata = { title: "Materials" };

export default async function MaterialsPage() {
  await requirePage("/materials");
  return <Suspense><MaterialList /></Suspense>;
}
