const keys = [
  ["Enter", "next line; a new one has material, batch, sheet, V and punch as above"],
  ["\"", "copies what is above it"],
  ["↑ ↓", "the same column of another line"],
  ["Ctrl+Enter", "saves every line, or none"],
  ["Ctrl+Delete", "removes the line"],
  ["Ctrl+V", "lays cells of a spreadsheet over the lines"],
] as const;

/** How the notebook is written in, and what its columns mean. */
export function EntryNotes() {
  return (
    <div className="mt-3 grid grid-cols-1 gap-x-10 gap-y-3 text-sm text-ink-soft lg:grid-cols-2">
      <dl className="grid grid-cols-[auto_1fr] gap-x-4 gap-y-0.5 self-start">
        {keys.map(([key, does]) => <div key={key} className="contents"><dt className="num text-ink">{key}</dt><dd>{does}</dd></div>)}
      </dl>
      <div className="max-w-prose space-y-1">
        <p>Flanges are outside lengths: up to 90° to where the outside surfaces would meet, above 90° over the bend.</p>
        <p>Nominal is what the sheet was bought as; left empty it is the nearest usual thickness, shown pale.</p>
        <p>± has coverage factor 2 (about 95 %). * not measured: the radius that the V, or a rounder punch, gives.</p>
      </div>
    </div>
  );
}
