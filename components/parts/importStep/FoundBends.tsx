"use client";
import { Crosshair } from "lucide-react";
import type { RecognisedBend, RecognisedPart } from "@/bending/exchange/step/recognisedPart";
import { Button } from "@/components/ui/Button";
import { DataTable, type Column } from "@/components/ui/DataTable";
import { IconButton } from "@/components/ui/IconButton";
import { NumberInput } from "@/components/ui/NumberInput";
import { formatFixed } from "@/lib/format/formatFixed";
import { bendLook } from "../drawing/bendLook";
import type { ImportedModel } from "./importedModel";
import { degreesOf, roundedTo, type BendForm, type ImportForm } from "./importForm";

interface FoundBendsProps {
  readonly part: RecognisedPart;
  readonly model: ImportedModel | null;
  readonly form: ImportForm;
  readonly problemAt: (path: string) => string | undefined;
  readonly onChange: (bends: readonly BendForm[]) => void;
  readonly marked: readonly number[];
  readonly onMark: (faces: readonly number[]) => void;
}

/** Every bend found: where, which way, how far, with what radius; radius and angle can be rounded. */
export function FoundBends({ part, model, form, problemAt, onChange, marked, onMark }: FoundBendsProps) {
  const set = (index: number, change: Partial<BendForm>) => onChange(form.bends.map((bend, i) => (i === index ? { ...bend, ...change } : bend)));
  const name = (plate: number) => (plate === 0 ? "base" : `b${plate}`);
  const rows = part.bends.map((bend, index) => ({ bend, index }));
  const columns: readonly Column<{ readonly bend: RecognisedBend; readonly index: number }>[] = [
    { key: "id", header: "Bend", rowHeader: true, cell: ({ bend }) => <span className="font-medium whitespace-nowrap">{name(bend.child)} <span className="font-normal text-ink-faint">on {name(bend.parent)}</span></span> },
    { key: "direction", header: "Way", cell: ({ bend }) => <span className="whitespace-nowrap">{bendLook[bend.direction].letter}, {bend.direction}</span> },
    { key: "length", header: "Length", align: "right", cell: ({ bend }) => <span className="num">{formatFixed(bend.length, 2)}</span> },
    { key: "angle", header: "Angle", className: "w-28", cell: ({ bend, index }) => (
      <NumberInput id={`import-angle-${index}`} label={`Angle of ${name(bend.child)}`} labelHidden unit="°" value={form.bends[index]?.angle ?? ""} onChange={(event) => set(index, { angle: event.target.value })} error={problemAt(`bends.${index}.angle`)} />
    ) },
    { key: "radius", header: "Inside radius", className: "w-32", cell: ({ bend, index }) => (
      <NumberInput id={`import-radius-${index}`} label={`Inside radius of ${name(bend.child)}`} labelHidden unit="mm" value={form.bends[index]?.insideRadius ?? ""} onChange={(event) => set(index, { insideRadius: event.target.value })} error={problemAt(`bends.${index}.insideRadius`)} />
    ) },
    { key: "allowance", header: "Allowance", align: "right", cell: ({ index }) => <span className="num">{model?.part.bends[index] ? formatFixed(model.part.bends[index].allowance, 2) : "–"}</span> },
    { key: "show", header: "", align: "right", cell: ({ bend }) => {
      const on = bend.faces.length > 0 && bend.faces.every((face) => marked.includes(face));
      return bend.faces.length === 0 ? null : <IconButton label={`${on ? "Stop pointing out" : "Point out"} ${name(bend.child)} in 3D`} aria-pressed={on} onClick={() => onMark(on ? [] : bend.faces)}><Crosshair aria-hidden /></IconButton>;
    } },
  ];
  if (part.bends.length === 0) return <p className="text-ink-soft">No bend was found: the part is a flat plate.</p>;
  return (
    <div className="space-y-3">
      <DataTable caption="Bends found, lengths in mm" columns={columns} rows={rows} rowKey={({ bend }) => name(bend.child)} dense empty={null} />
      <div className="flex flex-wrap gap-2">
        <Button look="plain" size="small" onClick={() => onChange(part.bends.map((bend, i) => ({ angle: form.bends[i]?.angle ?? "", insideRadius: roundedTo(bend.insideRadius, 0.1) })))}>Round radii to 0.1 mm</Button>
        <Button look="plain" size="small" onClick={() => onChange(part.bends.map((bend, i) => ({ insideRadius: form.bends[i]?.insideRadius ?? "", angle: roundedTo(degreesOf(bend.angle), 0.5) })))}>Round angles to 0.5°</Button>
        <Button look="quiet" size="small" onClick={() => onChange(part.bends.map(({ insideRadius, angle }) => ({ insideRadius: roundedTo(insideRadius, 0.001), angle: roundedTo(degreesOf(angle), 0.001) })))}>As found</Button>
      </div>
    </div>
  );
}
