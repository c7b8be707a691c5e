import { DataTable, type Column } from "@/components/ui/DataTable";
import { Panel } from "@/components/ui/Panel";
import type { DocumentChange } from "./documentChanges";

interface ChangeTableProps {
  readonly title: string;
  readonly changes: readonly DocumentChange[];
  readonly names: readonly [string, string];
  readonly none: string;
}

const said = (value: string | null, missing: string) => (value === null ? <span className="text-ink-faint">{missing}</span> : <span className="num">{value}</span>);

export function ChangeTable({ title, changes, names, none }: ChangeTableProps) {
  const columns: readonly Column<DocumentChange>[] = [
    { key: "name", header: "What", rowHeader: true, cell: ({ name }) => name },
    { key: "before", header: names[0], align: "right", cell: ({ before }) => said(before, "not there") },
    { key: "after", header: names[1], align: "right", cell: ({ after }) => said(after, "gone") },
  ];
  return (
    <Panel title={title} aside={changes.length === 0 ? undefined : String(changes.length)}>
      <DataTable caption={title} columns={columns} rows={changes} rowKey={({ key }) => key} dense empty={<p className="text-ink-soft">{none}</p>} />
    </Panel>
  );
}
