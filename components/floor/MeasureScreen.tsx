import type { SheetView } from "@/lib/sheet/sheetView";

/** What to measure on the first part. */
export function MeasureScreen({ view }: { readonly view: SheetView }) {
  return (
    <div className="grow p-4">
      <h2 className="mb-3 text-2xl">Measure the first part</h2>
      <ul className="grid gap-2 lg:grid-cols-2">
        {view.measurements.map((entry) => (
          <li key={entry.what} className="flex min-h-16 items-center gap-4 border-2 border-rule-strong bg-sheet px-4 py-2">
            <span className="grow text-xl">{entry.what}</span>
            <span className="num text-3xl font-semibold whitespace-nowrap">{entry.nominal}</span>
            <span className="num text-lg whitespace-nowrap text-ink-soft">{entry.low}<br />{entry.high}</span>
          </li>
        ))}
      </ul>
    </div>
  );
}
