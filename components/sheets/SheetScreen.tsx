"use client";
import { FileDown, Printer } from "lucide-react";
import Link from "next/link";
import { CheckAgain } from "@/components/planJobs/CheckAgain";
import { PlanOfSheet } from "@/components/planJobs/PlanOfSheet";
import { FlatChangeNotice } from "@/components/ui/FlatChangeNotice";
import { Notice } from "@/components/ui/Notice";
import { PageHeader } from "@/components/ui/PageHeader";
import { StateMark } from "@/components/ui/StateMark";
import { buttonClasses } from "@/components/ui/buttonClasses";
import { formatMoment } from "@/lib/format/formatMoment";
import { useSheet } from "@/lib/queries/sheets";
import type { SheetDetail } from "@/lib/schemas/views";
import { ReleaseSheet } from "./ReleaseSheet";
import { SheetPaper } from "./SheetPaper";
import { sheetState } from "./sheetState";

interface SheetScreenProps { readonly id: string; readonly mayRelease: boolean; readonly maySeePlans: boolean; readonly maySeeFloor: boolean }

/** The office's view of a sheet: its state, releasing it, and the sheet itself as it will be printed. */
export function SheetScreen({ id, ...may }: SheetScreenProps) {
  const { data, error } = useSheet(id);
  if (error) return <Notice tone="wrong" title="This sheet cannot be shown">{error.message}</Notice>;
  if (!data) return <p className="py-10 text-ink-faint">Loading the setup sheet…</p>;
  return (
    <>
      <SheetHead sheet={data} {...may} />
      {data.state === "superseded" ? (
        <div className="mb-6"><Notice tone="wrong" title="Superseded: do not work from this sheet">
          <Link href={`/sheets?state=released&q=${encodeURIComponent(data.partNumber)}`} className="text-accent-ink underline underline-offset-2">The released sheets of {data.partNumber}</Link>
        </Notice></div>
      ) : data.latestRevision > data.revision ? (
        <div className="mb-6"><Notice tone="caution" title={`The part has changed: revision ${data.latestRevision} is newer than this sheet’s revision ${data.revision}`}>Plan the new revision and release its sheet.</Notice></div>
      ) : null}
      {data.flatChange === null ? null : (
        <div className="mb-6"><FlatChangeNotice change={data.flatChange} of="this sheet">The sheet stays as it was released. <Link href={`/parts/${data.partId}`} className="text-accent-ink underline underline-offset-2">Plan {data.partNumber} again</Link> and release the new sheet; it takes the place of this one.</FlatChangeNotice></div>
      )}
      {may.maySeePlans ? <PlanOfSheet planId={data.planId} /> : null}
      <div className="border border-rule-strong bg-white p-6 shadow-[0_2px_0_var(--rule)]"><SheetPaper view={data.view} /></div>
    </>
  );
}

function SheetHead({ sheet, mayRelease, maySeePlans, maySeeFloor }: Omit<SheetScreenProps, "id"> & { readonly sheet: SheetDetail }) {
  return (
    <PageHeader kicker="Setup sheet" title={<><span className="num">{sheet.number}</span> {sheet.partName}</>} summary={sheetState[sheet.state].sentence}
      actions={<>
        {maySeePlans ? <Link href={`/plans/${sheet.planId}`} className={buttonClasses("quiet")}>Plan</Link> : null}
        {maySeePlans && mayRelease ? <CheckAgain planId={sheet.planId} /> : null}
        {sheet.state === "released" && maySeeFloor ? <Link href={`/floor/${sheet.id}`} className={buttonClasses("quiet")}>At the brake</Link> : null}
        <Link href={`/print/${sheet.id}`} className={buttonClasses("plain")}><Printer aria-hidden />Print</Link>
        <a href={`/api/sheets/${sheet.id}/pdf`} className={buttonClasses("plain")}><FileDown aria-hidden />PDF</a>
        {mayRelease && sheet.state === "draft" ? <ReleaseSheet sheet={sheet} /> : null}
      </>}
      facts={[
        { label: "State", value: <StateMark tone={sheetState[sheet.state].tone}>{sheet.state}</StateMark> },
        { label: "Part", value: <Link href={`/parts/${sheet.partId}`} className="num underline">{sheet.partNumber}</Link> },
        { label: "Revision", value: <span className="num">{sheet.revision}</span> },
        { label: "Brake", value: sheet.machine },
        { label: "Batch", value: <span className="num">{sheet.batch}</span> },
        { label: "Made", value: formatMoment(sheet.createdAt) },
        ...(sheet.releasedAt ? [{ label: "Released", value: `${formatMoment(sheet.releasedAt)} by ${sheet.releasedBy ?? "somebody who has left"}` }] : []),
      ]} />
  );
}
