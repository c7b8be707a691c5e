import type { Metadata } from "next";
import { FloorSheet } from "@/components/floor/FloorSheet";
import { requirePage } from "@/lib/auth/requirePage";

export const metadata: Metadata = { title: "Setup sheet at the brake" };

export default async function FloorSheetPage({ params }: { readonly params: Promise<{ id: string }> }) {
  await requirePage("/floor/[id]");
  return <FloorSheet id={(await params).id} />;
}
