interface ChartTableProps {
  readonly name: string;
  readonly heads: readonly string[];
  readonly rows: readonly (readonly string[])[];
}

/** The same numbers as a table, for who cannot see the chart or wants to read off exactly. */
export function ChartTable({ name, heads, rows }: ChartTableProps) {
  return (
    <details className="mt-2">
      <summary className="inline-block rounded px-1 text-accent-ink underline underline-offset-2">{name} as a table</summary>
      <div className="mt-2 overflow-x-auto" tabIndex={0} role="region" aria-label={`${name} as a table`}>
        <table className="border-collapse text-left">
          <caption className="sr-only">{name}</caption>
          <thead><tr className="border-b border-rule-strong">{heads.map((head) => <th key={head} scope="col" className="px-3 py-1 text-sm font-medium text-ink-soft">{head}</th>)}</tr></thead>
          <tbody>{rows.map((row) => (
            <tr key={row.join("|")} className="border-b border-rule">
              {row.map((cell, i) => (i === 0 ? <th key={i} scope="row" className="num px-3 py-1 font-normal">{cell}</th> : <td key={i} className="num px-3 py-1">{cell}</td>))}
            </tr>
          ))}</tbody>
        </table>
      </div>
    </details>
  );
}
