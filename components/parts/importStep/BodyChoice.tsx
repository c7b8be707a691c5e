"use client";
import { Button } from "@/components/ui/Button";
import { DataTable, type Column } from "@/components/ui/DataTable";
import { Notice } from "@/components/ui/Notice";
import { formatNumber } from "@/lib/format/formatNumber";
import type { BodyFacts } from "@/lib/schemas/stepReading";

interface BodyChoiceProps {
  readonly message: string;
  readonly bodies: readonly BodyFacts[];
  readonly onChoose: (body: number) => void;
}

/** Which body of a file with several is the part. */
export function BodyChoice({ message, bodies, onChoose }: BodyChoiceProps) {
  const columns: readonly Column<BodyFacts>[] = [
    { key: "body", header: "Body", rowHeader: true, cell: ({ body }) => <span className="num font-medium">{body}</span> },
    { key: "size", header: "Size", align: "right", cell: ({ size }) => <span className="num whitespace-nowrap">{size.map((value) => formatNumber(value, 1)).join(" × ")} mm</span> },
    { key: "volume", header: "Volume", align: "right", cell: ({ volume }) => <span className="num whitespace-nowrap">{formatNumber(volume / 1000, 2)} cm³</span> },
    { key: "faces", header: "Faces", align: "right", cell: ({ faces }) => <span className="num">{faces}</span> },
    { key: "choose", header: "", align: "right", cell: ({ body }) => <Button size="small" look="plain" onClick={() => onChoose(body)} aria-label={`Read body ${body}`}>Read this one</Button> },
  ];
  return (
    <div className="space-y-3">
      <Notice tone="caution" title="Several bodies" live>{message}</Notice>
      <DataTable caption="Bodies in the file" columns={columns} rows={bodies} rowKey={({ body }) => String(body)} dense empty={null} />
    </div>
  );
}
