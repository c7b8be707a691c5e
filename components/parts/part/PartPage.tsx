"use client";
import { useRouter, useSearchParams } from "next/navigation";
import { unitName } from "@/lib/format/unitName";
import { JobsUnderWay } from "@/components/planJobs/JobsUnderWay";
import { FlatChangeNotice } from "@/components/ui/FlatChangeNotice";
import { Loading } from "@/components/ui/Loading";
import { LoadProblem } from "@/components/ui/LoadProblem";
import { Notice } from "@/components/ui/Notice";
import { Panel } from "@/components/ui/Panel";
import { useMaterials } from "@/lib/queries/materials";
import { usePart } from "@/lib/queries/parts";
import { useShopTable } from "@/lib/queries/shopTable";
import { BendTable } from "../drawing/BendTable";
import { FlatFacts } from "../drawing/FlatFacts";
import { PartDrawings } from "../drawing/PartDrawings";
import { PartFindings } from "../findings/PartFindings";
import { partModelOf } from "./partModelOf";
import { PartHead } from "./PartHead";
import { PlansOfPart } from "./PlansOfPart";
import { Revisions } from "./Revisions";

interface PartPageProps {
  readonly id: string;
  readonly mayWrite: boolean;
  readonly mayPlan: boolean;
  readonly maySeePlans: boolean;
}

/** One part: its drawings, numbers, plans and revisions; `?revision=` shows an older one. */
export function PartPage({ id, mayWrite, mayPlan, maySeePlans }: PartPageProps) {
  const router = useRouter();
  const asked = Number(useSearchParams().get("revision"));
  const part = usePart(id, Number.isInteger(asked) && asked > 0 ? asked : undefined);
  const materials = useMaterials();
  const shop = useShopTable(part.data?.document.material ?? "");
  if (part.isPending || materials.isPending || (part.isSuccess && shop.isPending)) return <Loading what="the part" />;
  if (part.isError) return <LoadProblem what="The part" error={part.error} onRetry={() => void part.refetch()} />;
  const { data } = part;
  const newest = data.revisions[0]?.revision ?? data.revision.revision;
  const model = partModelOf(data.document, materials.data ?? [], shop.data);
  return (
    <>
      <PartHead part={data} newest={newest} mayWrite={mayWrite} mayPlan={mayPlan} />
      {maySeePlans ? <JobsUnderWay of={{ partId: id }} mayWrite={mayPlan} /> : null}
      {data.revision.revision === newest ? null : (
        <div className="mb-6"><Notice tone="caution" title={`This is revision ${data.revision.revision}; the newest is ${newest}`}>
          <button type="button" className="text-accent-ink underline underline-offset-2" onClick={() => router.replace(`/parts/${id}`)}>Show the newest</button>
        </Notice></div>
      )}
      {data.flatChange === null ? null : (
        <div className="mb-6"><FlatChangeNotice change={data.flatChange} of={`revision ${data.revision.revision} as saved`}>
          {data.revision.revision === newest ? "This page shows the new numbers. Plan the part again before more blanks are cut; saving a revision stores the new flat." : "An older revision keeps the flat that it was saved with."}
        </FlatChangeNotice></div>
      )}
      <div className="grid grid-cols-1 gap-x-10 gap-y-8 xl:grid-cols-[minmax(0,1fr)_minmax(0,44rem)]">
        <div className="space-y-6">
          {model.ok ? (
            <PartFindings model={{ part: model.value.part, document: data.document }}>{(marks) => <PartDrawings {...marks} part={model.value.part} flat={model.value.flat} units={data.document.units} dimension={data.document.dimension ?? "outside"} />}</PartFindings>
          ) : (
            <Notice tone="wrong" title="This revision cannot be built any more">
              <ul>{model.error.map((problem) => <li key={problem.path + problem.message}><code className="num mr-2">{problem.path}</code>{problem.message}</li>)}</ul>
            </Notice>
          )}
        </div>
        <div className="space-y-8">
          {model.ok ? (
            <>
              <FlatFacts part={model.value.part} flat={model.value.flat} units={data.document.units} />
              <Panel title="Bends" aside={`lengths in ${unitName(data.document.units)}`}><BendTable part={model.value.part} units={data.document.units} /></Panel>
            </>
          ) : null}
          {maySeePlans ? <PlansOfPart plans={data.plans} /> : null}
          <Revisions part={data} />
        </div>
      </div>
    </>
  );
}
