"use client";
import { Plus } from "lucide-react";
import { useState } from "react";
import { Button } from "@/components/ui/Button";
import { Facts } from "@/components/ui/Facts";
import { Loading } from "@/components/ui/Loading";
import { LoadProblem } from "@/components/ui/LoadProblem";
import { PageHeader } from "@/components/ui/PageHeader";
import { Panel } from "@/components/ui/Panel";
import { formatAngle } from "@/lib/format/formatAngle";
import { formatLength } from "@/lib/format/formatLength";
import { formatMoment } from "@/lib/format/formatMoment";
import { formatNumber } from "@/lib/format/formatNumber";
import { useTool } from "@/lib/queries/tools";
import type { ToolDetail } from "@/lib/schemas/views";
import { ToolDrawing } from "../drawing/ToolDrawing";
import { AddPieces } from "./AddPieces";
import { PieceTable } from "./PieceTable";

export function ToolPage({ code, mayWrite }: { readonly code: string; readonly mayWrite: boolean }) {
  const tool = useTool(code);
  const [adding, setAdding] = useState(false);
  if (tool.isPending) return <Loading what="the tool" />;
  if (tool.isError) return <LoadProblem what="The tool" error={tool.error} onRetry={() => void tool.refetch()} />;
  const { data } = tool;
  return (
    <>
      <PageHeader kicker={data.kind} title={data.code} summary={data.name} facts={headFacts(data)}
        actions={mayWrite ? <Button icon={<Plus aria-hidden />} onClick={() => setAdding(true)}>Add pieces</Button> : null} />
      <div className="grid grid-cols-1 gap-x-10 gap-y-8 lg:grid-cols-[minmax(0,26rem)_minmax(0,1fr)]">
        <div className="space-y-6">
          <ToolDrawing tool={data} />
          <Panel title="Ratings"><Facts rows={ratings(data)} /></Panel>
        </div>
        <Panel title="Pieces" aside={<><span className="num">{data.piecesInService}</span> of <span className="num">{data.pieces}</span> in service, <span className="num">{formatLength(data.lengthInServiceMm, "mm")}</span></>}>
          <PieceTable pieces={data.pieceList} mayWrite={mayWrite} />
        </Panel>
      </div>
      {adding ? <AddPieces code={data.code} onClose={() => setAdding(false)} /> : null}
    </>
  );
}

function headFacts(tool: ToolDetail) {
  const v = tool.vOpeningMm === null ? [] : [{ label: "V opening", value: <span className="num">{formatLength(tool.vOpeningMm, "mm")}</span> }];
  return [
    ...v,
    { label: tool.kind === "punch" ? "Tip angle" : "V angle", value: <span className="num">{formatAngle(tool.angleDeg)}</span> },
    { label: tool.kind === "punch" ? "Tip radius" : "Shoulder radius", value: <span className="num">{formatLength(tool.radiusMm, "mm")}</span> },
    { label: "Height", value: <span className="num">{formatLength(tool.heightMm, "mm")}</span> },
    { label: "Rating", value: <span className="num">{formatNumber(tool.maxForcePerMetreKN, 0)} kN/m</span> },
    { label: "Tang", value: tool.tang },
  ];
}

function ratings(tool: ToolDetail) {
  const longest = tool.pieceList.reduce((most, piece) => Math.max(most, piece.lengthMm), 0);
  return [
    { label: "Most force for each metre", value: <span className="num">{formatNumber(tool.maxForcePerMetreKN, 0)} kN/m</span> },
    { label: "On the longest piece", value: <span className="num">{longest === 0 ? "–" : `${formatNumber((tool.maxForcePerMetreKN * longest) / 1000, 0)} kN over ${formatLength(longest, "mm")}`}</span> },
    { label: "Working height, seat to working edge", value: <span className="num">{formatLength(tool.heightMm, "mm")}</span> },
    ...(tool.flattening === null ? [] : [
      { label: "Slot that flattens hems, under the top", value: <span className="num">{formatLength(tool.flattening.floor, "mm")}</span> },
      { label: "Its end, from the middle of the V", value: <span className="num">{formatLength(tool.flattening.back, "mm")}</span> },
      { label: "It opens", value: <span className="num">{formatLength(tool.flattening.opening, "mm")}</span> },
    ]),
    { label: "Last changed", value: formatMoment(tool.updatedAt) },
  ];
}
