import { Suspense } from "react";
import { ComparePage } from "@/components/parts/compare/ComparePage";
import { requirePage } from "@/lib/auth/requirePage";

export const metadata = { title: "Two revisions" };

export default async function CompareRoute({ params }: { readonly params: Promise<{ readonly id: string }> }) {
  await requirePage("/parts/[id]/compare");
  const { id } = await params;
  return (
    <Suspense>
      <ComparePage id={id} />
    </Suspense>
  );
}
