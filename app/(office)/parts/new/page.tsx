import { NewPart } from "@/components/parts/editor/NewPart";
import { requirePage } from "@/lib/auth/requirePage";

export const metadata = { title: "New part" };

interface NewPartQuery { readonly copy?: string | readonly string[]; readonly revision?: string | readonly string[] }

/** `?copy=` names a part to start from, `&revision=` which of its revisions. */
export default async function NewPartPage({ searchParams }: { readonly searchParams: Promise<NewPartQuery> }) {
  await requirePage("/parts/new");
  const { copy, revision } = await searchParams;
  const asked = Number(revision);
  return <NewPart copyOf={typeof copy === "string" && copy !== "" ? { id: copy, revision: Number.isInteger(asked) && asked > 0 ? asked : undefined } : null} />;
}
