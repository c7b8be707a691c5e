import { NewTool } from "@/components/tooling/create/NewTool";
import { requirePage } from "@/lib/auth/requirePage";

export const metadata = { title: "New tool" };

export default async function NewToolPage() {
  await requirePage("/tools/new");
  return <NewTool />;
}
