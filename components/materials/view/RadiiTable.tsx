import type { MinimumRadiusTable } from "@/bending/handbook/material";

/** Smallest inside radii by thickness, folded away when there are many. */
export function RadiiTable({ table: { as, rows } }: { readonly table: MinimumRadiusTable }) {
  const unit = as === "mm" ? "mm" : "× t";
  const toldApart = rows.some(({ along }) => along !== null);
  return (
    <details className="text-right">
      <summary className="whitespace-nowrap">{rows.length} thickness ranges</summary>
      <table className="mt-1 ml-auto text-right text-sm">
        <thead><tr className="text-ink-faint"><th scope="col" className="pl-4 font-medium">up to, mm</th><th scope="col" className="pl-4 font-medium">{toldApart ? "across grain" : "radius"}, {unit}</th>{toldApart ? <th scope="col" className="pl-4 font-medium">along, {unit}</th> : null}</tr></thead>
        <tbody className="num font-normal">
          {rows.map(({ upTo, across, along }) => <tr key={upTo}><td className="pl-4">{upTo}</td><td className="pl-4">{across}</td>{toldApart ? <td className="pl-4">{along ?? "–"}</td> : null}</tr>)}
        </tbody>
      </table>
    </details>
  );
}
