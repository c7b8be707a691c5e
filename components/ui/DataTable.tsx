"use client";
import { ArrowDown, ArrowUp, ChevronsUpDown } from "lucide-react";
import type { ReactNode } from "react";
import { Button } from "./Button";
import { classes } from "./classes";
import { EmptyState } from "./EmptyState";
import { Pager } from "./Pager";

export interface Column<Row> {
  /** Also the sort key that the server knows, when `sortable`. */
  readonly key: string;
  readonly header: string;
  readonly cell: (row: Row) => ReactNode;
  readonly sortable?: boolean;
  readonly align?: "left" | "right";
  /** Stands as the row's header for screen readers. */
  readonly rowHeader?: boolean;
  readonly className?: string;
}

export interface ListState {
  readonly q: string;
  readonly sort: string;
  readonly dir: "asc" | "desc";
  readonly page: number;
  readonly pageSize: number;
}

interface DataTableProps<Row> {
  readonly caption: string;
  readonly columns: readonly Column<Row>[];
  readonly rows: readonly Row[];
  readonly rowKey: (row: Row) => string;
  /** Server-driven: what is asked for now, how many there are in all, and how to ask for something else. */
  readonly list?: ListState & { readonly total: number; readonly onChange: (change: Partial<ListState>) => void };
  readonly loading?: boolean;
  readonly empty: ReactNode;
  readonly dense?: boolean;
}

export function DataTable<Row>({ caption, columns, rows, rowKey, list, loading = false, empty, dense = false }: DataTableProps<Row>) {
  if (rows.length === 0 && !loading) {
    return list !== undefined && list.page > 1 ? <BeyondTheLast onFirst={() => list.onChange({ page: 1 })} /> : <>{empty}</>;
  }
  return (
    <div className="min-w-0">
      <div className="relative overflow-x-auto border-y border-ink" tabIndex={0} role="region" aria-label={caption} aria-busy={loading}>
        <table className="w-full border-collapse text-left">
          <caption className="sr-only">{caption}</caption>
          <thead>
            <tr className="border-b border-rule-strong">
              {columns.map((column) => <Head key={column.key} column={column} list={list} />)}
            </tr>
          </thead>
          <tbody className={loading ? "opacity-60" : undefined}>
            {rows.map((row) => (
              <tr key={rowKey(row)} className="border-b border-rule last:border-b-0 hover:bg-accent-wash/50">
                {columns.map((column) => {
                  const look = classes("align-middle", dense ? "px-2.5 py-1" : "px-3 py-2", column.align === "right" && "text-right", column.className);
                  return column.rowHeader === true
                    ? <th key={column.key} scope="row" className={classes(look, "font-normal")}>{column.cell(row)}</th>
                    : <td key={column.key} className={look}>{column.cell(row)}</td>;
                })}
              </tr>
            ))}
          </tbody>
        </table>
        {rows.length === 0 && loading ? <p className="px-3 py-6 text-ink-faint">Loading…</p> : null}
      </div>
      {list === undefined ? null : <Pager list={list} total={list.total} onPage={(page) => list.onChange({ page })} />}
    </div>
  );
}

/** The list has grown shorter than the page that was asked for. */
function BeyondTheLast({ onFirst }: { readonly onFirst: () => void }) {
  return <EmptyState title="The list does not reach this page" action={<Button look="plain" onClick={onFirst}>Go to its first page</Button>}>It has grown shorter since.</EmptyState>;
}

function Head<Row>({ column, list }: { readonly column: Column<Row>; readonly list: DataTableProps<Row>["list"] }) {
  const look = classes("px-3 py-1 text-sm font-medium whitespace-nowrap text-ink-soft", column.align === "right" && "text-right");
  if (list === undefined || column.sortable !== true) return <th scope="col" className={look}>{column.header}</th>;
  const active = list.sort === column.key;
  const next = active && list.dir === "asc" ? "desc" : "asc";
  const Icon = !active ? ChevronsUpDown : list.dir === "asc" ? ArrowUp : ArrowDown;
  return (
    <th scope="col" className={look} aria-sort={active ? (list.dir === "asc" ? "ascending" : "descending") : "none"}>
      <button type="button" onClick={() => list.onChange({ sort: column.key, dir: next, page: 1 })}
        className={classes("inline-flex min-h-8 items-center gap-1 font-medium hover:text-ink", column.align === "right" && "flex-row-reverse", active && "text-ink")}>
        {column.header}<Icon aria-hidden className={classes("size-3.5", !active && "text-steel-400")} />
      </button>
    </th>
  );
}
