import { NewPart } from "@/components/parts/editor/NewPart";
import { requirePage } from "@/lib/auth/requirePage";

export const metadata = { title: "New part" };

export default async function NewPartPage() {
  await requirePage("/parts/new");
  return <NewPart />;
}
