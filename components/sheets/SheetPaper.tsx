import { BedMapDrawing } from "@/components/preview/BedMapDrawing";
import { allowanceLine } from "@/lib/sheet/allowanceLine";
import { measurementTable } from "@/lib/sheet/measurementTable";
import type { SheetView } from "@/lib/sheet/sheetView";
import { PaperSteps } from "./PaperSteps";
import { PaperTable } from "./PaperTable";

/** The setup sheet as it is read and printed. Every number is the view's own text. */
export function SheetPaper({ view, code }: { readonly view: SheetView; readonly code?: React.ReactNode }) {
  const measured = measurementTable(view.measurements);
  return (
    <article className="sheet-paper space-y-4 text-ink" aria-label={`Setup sheet ${view.header.number}`}>
      <PaperHead view={view} code={code} />
      <Cautions view={view} />
      <div className="grid gap-x-6 gap-y-4 lg:grid-cols-[3fr_2fr] print:grid-cols-[3fr_2fr]">
        <section>
          <h2 className="caption mb-1">Tools to fetch</h2>
          <PaperTable heads={["Piece", "Kind", "Length", "Horn", "Rack", "At"]} wide={[0, 4]}
            rows={view.pickList.map((line) => [line.piece, line.kind, line.length, line.horn, line.rack, line.station])} />
        </section>
        <section>
          <h2 className="caption mb-1">Measure on the first part</h2>
          <PaperTable heads={measured.heads} rows={measured.rows} />
          <p className="mt-1 text-xs text-ink-soft">{measured.note}</p>
        </section>
      </div>
      <section className="break-inside-avoid">
        <h2 className="caption mb-1">Bed, seen by the operator ({view.bedMap.length} long; tools at scale)</h2>
        <BedMapDrawing map={view.bedMap} close className="w-full border border-rule" />
      </section>
      <PaperSteps view={view} />
      <footer className="flex flex-wrap justify-between gap-x-8 gap-y-1 border-t border-ink pt-2 text-xs text-ink-soft">
        <p>Blank <span className="num">{view.flat.width} × {view.flat.depth}</span>, <span className="num">{view.flat.mass}</span>. Allowances: {allowanceLine(view.flat)}.</p>
        <p>{view.header.conventions.join(" ")}</p>
      </footer>
    </article>
  );
}

function PaperHead({ view: { header }, code }: { readonly view: SheetView; readonly code: React.ReactNode }) {
  const cells = [
    ["Sheet", header.number], ["Part", header.partNumber], ["Revision", header.revision], ["Brake", header.machine], ["Material", header.material], ["Thickness", header.thickness],
    ["Batch", header.batch], ["Units", header.units], ["Setup", header.setupTime], ["A part", header.timePerPart],
  ] as const;
  return (
    <header className="flex gap-4 border-y-2 border-ink py-2">
      <div className="grow">
        <p className="text-xl font-semibold">{header.partName}</p>
        <dl className="mt-1 flex flex-wrap gap-x-6 gap-y-1">
          {cells.map(([label, value]) => <div key={label}><dt className="caption">{label}</dt><dd className="font-medium">{value}</dd></div>)}
        </dl>
      </div>
      {code}
    </header>
  );
}

function Cautions({ view }: { readonly view: SheetView }) {
  return (
    <section className="break-inside-avoid border-l-4 border-amber pl-3">
      <h2 className="caption mb-1">Cautions</h2>
      <ul className="gap-x-8 text-sm md:columns-2 print:columns-2">
        {view.cautions.map((caution, index) => (
          <li key={index} className={caution.level === "stop" ? "mb-0.5 break-inside-avoid font-semibold" : "mb-0.5 break-inside-avoid"}>
            {caution.level === "stop" ? "Stop: " : ""}{caution.text}{caution.steps.length > 0 ? ` (step ${caution.steps.join(", ")})` : ""}
          </li>
        ))}
      </ul>
    </section>
  );
}
