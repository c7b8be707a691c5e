interface PaperTableProps {
  readonly heads: readonly string[];
  readonly rows: readonly (readonly string[])[];
  /** Columns that stand out. */
  readonly wide?: readonly number[];
}

/** A ruled table of texts; the first column heads its row. */
export function PaperTable({ heads, rows, wide = [0] }: PaperTableProps) {
  return (
    <table className="w-full border-collapse border-y border-ink text-left text-sm">
      <thead><tr className="border-b border-rule-strong">{heads.map((head) => <th key={head} scope="col" className="py-0.5 pr-2 font-medium text-ink-soft">{head}</th>)}</tr></thead>
      <tbody>
        {rows.map((row, index) => (
          <tr key={index} className="break-inside-avoid border-b border-rule last:border-b-0">
            {row.map((text, column) => {
              const look = `py-0.5 pr-2 num ${wide.includes(column) ? "font-semibold" : ""}`;
              return column === 0 ? <th key={column} scope="row" className={look}>{text}</th> : <td key={column} className={look}>{text}</td>;
            })}
          </tr>
        ))}
      </tbody>
    </table>
  );
}
