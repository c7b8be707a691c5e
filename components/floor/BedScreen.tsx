import { BedMapDrawing } from "@/components/preview/BedMapDrawing";
import type { SheetView } from "@/lib/sheet/sheetView";

/** Where the tools stand, as large as the screen. */
export function BedScreen({ view, placed }: { readonly view: SheetView; readonly placed: ReadonlySet<string> }) {
  return (
    <div className="flex grow flex-col justify-between gap-4 p-4">
      <BedMapDrawing map={view.bedMap} placed={placed} close className="max-h-[26rem] w-full" />
      <ul className="flex flex-wrap gap-x-10 gap-y-2 text-2xl">
        {view.bedMap.stations.map((station) => (
          <li key={station.id}><span className="mr-3 text-3xl font-bold">{station.id}</span><span className="num">{station.fromText}</span> to <span className="num">{station.toText}</span> from the middle</li>
        ))}
      </ul>
    </div>
  );
}
