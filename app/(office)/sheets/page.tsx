import type { Metadata } from "next";
import { SheetList } from "@/components/sheets/SheetList";
import { requirePage } from "@/lib/auth/requirePage";

export const metadata: Metadata = { title: "Setup sheets" };

export default async function SheetsPage() {
  await requirePage("/sheets");
  return <SheetList />;
}
