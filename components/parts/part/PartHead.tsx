"use client";
import { Copy, PencilRuler, Route, Trash2 } from "lucide-react";
import Link from "next/link";
import { useState } from "react";
import { mmPer } from "@/bending/core/units";
import { Button } from "@/components/ui/Button";
import { buttonClasses } from "@/components/ui/buttonClasses";
import { IconButton } from "@/components/ui/IconButton";
import { PageHeader } from "@/components/ui/PageHeader";
import { formatLength } from "@/lib/format/formatLength";
import { formatMoment } from "@/lib/format/formatMoment";
import type { PartDetail } from "@/lib/schemas/views";
import { DeletePart } from "./DeletePart";
import { DownloadMenu } from "./DownloadMenu";
import { PlanDialog } from "./PlanDialog";

interface PartHeadProps {
  readonly part: PartDetail;
  readonly newest: number;
  readonly mayWrite: boolean;
  readonly mayPlan: boolean;
}

export function PartHead({ part, newest, mayWrite, mayPlan }: PartHeadProps) {
  const [planning, setPlanning] = useState(false);
  const [deleting, setDeleting] = useState(false);
  const { document } = part;
  const current = part.revision.revision === newest;
  return (
    <>
      <PageHeader kicker="Part" title={part.name} facts={[
        { label: "Number", value: <span className="num">{part.number}</span> },
        { label: "Revision", value: <span className="num">{part.revision.revision} of {newest}</span> },
        { label: "Material", value: document.material },
        { label: "Thickness", value: <span className="num">{formatLength(document.thickness * mmPer(document.units), document.units)}</span> },
        { label: "Measured", value: document.dimension ?? "outside" },
        { label: "Drawn by", value: part.revision.createdBy },
        { label: "Date", value: formatMoment(part.revision.createdAt) },
      ]} actions={(
        <>
          {mayWrite ? <IconButton label="Delete this part" danger onClick={() => setDeleting(true)}><Trash2 aria-hidden /></IconButton> : null}
          <DownloadMenu part={part} />
          {mayWrite ? <Link href={`/parts/new?copy=${part.id}&revision=${part.revision.revision}`} className={buttonClasses("plain")}><Copy aria-hidden />Copy</Link> : null}
          {mayWrite && current ? <Link href={`/parts/${part.id}/edit`} className={buttonClasses("plain")}><PencilRuler aria-hidden />Edit</Link> : null}
          {mayPlan ? <Button icon={<Route aria-hidden />} onClick={() => setPlanning(true)}>Plan the bends</Button> : null}
        </>
      )} />
      {planning ? <PlanDialog part={part} onClose={() => setPlanning(false)} /> : null}
      {deleting ? <DeletePart part={part} onClose={() => setDeleting(false)} /> : null}
    </>
  );
}
