import { EditPart } from "@/components/parts/editor/EditPart";
import { requirePage } from "@/lib/auth/requirePage";

export const metadata = { title: "New revision" };

export default async function EditPartPage({ params }: { readonly params: Promise<{ readonly id: string }> }) {
  await requirePage("/parts/[id]/edit");
  return <EditPart id={(await params).id} />;
}
