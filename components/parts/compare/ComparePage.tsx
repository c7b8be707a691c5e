"use client";
import { useRouter, useSearchParams } from "next/navigation";
import { Loading } from "@/components/ui/Loading";
import { LoadProblem } from "@/components/ui/LoadProblem";
import { Notice } from "@/components/ui/Notice";
import { PageHeader } from "@/components/ui/PageHeader";
import { Select } from "@/components/ui/Select";
import { TextLink } from "@/components/ui/TextLink";
import { useMaterials } from "@/lib/queries/materials";
import { usePart } from "@/lib/queries/parts";
import { useShopTable } from "@/lib/queries/shopTable";
import type { PartDetail } from "@/lib/schemas/views";
import { partModelOf } from "../part/partModelOf";
import { ChangeTable } from "./ChangeTable";
import { documentChanges } from "./documentChanges";
import { FlatsOverlaid } from "./FlatsOverlaid";
import { resultChanges } from "./resultChanges";

/** Two revisions of a part: what was changed, what follows from it, and the flats over each other. */
export function ComparePage({ id }: { readonly id: string }) {
  const newest = usePart(id);
  if (newest.isPending) return <Loading what="the part" />;
  if (newest.isError) return <LoadProblem what="The part" error={newest.error} onRetry={() => void newest.refetch()} />;
  return <Compare id={id} newest={newest.data} />;
}

function Compare({ id, newest }: { readonly id: string; readonly newest: PartDetail }) {
  const router = useRouter();
  const query = useSearchParams();
  const numbers = newest.revisions.map(({ revision }) => revision);
  const asked = (key: string, otherwise: number) => { const value = Number(query.get(key)); return numbers.includes(value) ? value : otherwise; };
  const to = asked("to", newest.revision.revision);
  const from = asked("from", numbers.find((number) => number < to) ?? to);
  const show = (change: { readonly from?: number; readonly to?: number }) => router.replace(`/parts/${id}/compare?from=${change.from ?? from}&to=${change.to ?? to}`);
  const options = numbers.map((number) => ({ value: String(number), label: `Revision ${number}` }));
  return (
    <>
      <PageHeader kicker={`Part ${newest.number}`} title={`${newest.name}: two revisions`} actions={<TextLink href={`/parts/${id}`}>Back to the part</TextLink>} />
      <div className="mb-6 flex flex-wrap gap-4">
        <Select id="compare-from" label="Before" value={String(from)} onChange={(value) => show({ from: Number(value) })} options={options} />
        <Select id="compare-to" label="After" value={String(to)} onChange={(value) => show({ to: Number(value) })} options={options} />
      </div>
      {numbers.length < 2 ? <Notice tone="note" title="This part has one revision so far">Edit it and save: the two can be compared here then.</Notice> : <Both id={id} from={from} to={to} />}
    </>
  );
}

function Both({ id, from, to }: { readonly id: string; readonly from: number; readonly to: number }) {
  const [older, newer] = [usePart(id, from), usePart(id, to)];
  const materials = useMaterials();
  const shops = [useShopTable(older.data?.document.material ?? ""), useShopTable(newer.data?.document.material ?? "")] as const;
  if (older.isPending || newer.isPending || materials.isPending) return <Loading what="both revisions" />;
  if (older.isError) return <LoadProblem what={`Revision ${from}`} error={older.error} onRetry={() => void older.refetch()} />;
  if (newer.isError) return <LoadProblem what={`Revision ${to}`} error={newer.error} onRetry={() => void newer.refetch()} />;
  const names = [`Revision ${from}`, `Revision ${to}`] as const;
  const [was, is] = [partModelOf(older.data.document, materials.data ?? [], shops[0].data), partModelOf(newer.data.document, materials.data ?? [], shops[1].data)];
  const { units } = newer.data.document;
  return (
    <div className="grid grid-cols-1 gap-x-10 gap-y-8 xl:grid-cols-[minmax(0,1fr)_minmax(0,44rem)]">
      <div className="space-y-6">
        {was.ok && is.ok ? <FlatsOverlaid older={was.value.flat} newer={is.value.flat} names={names} units={units} />
          : <Notice tone="wrong" title={`${was.ok ? names[1] : names[0]} cannot be built any more`}>Only what was typed is compared.</Notice>}
      </div>
      <div className="space-y-8">
        <ChangeTable title="What was changed" changes={documentChanges(older.data.document, newer.data.document)} names={names} none="Both say the same." />
        {was.ok && is.ok ? <ChangeTable title="What follows from it" changes={resultChanges(was.value, is.value, units)} names={names} none="Blank, bends and mass are the same." /> : null}
      </div>
    </div>
  );
}
