import type { ReactNode } from "react";

/** Names and values, ruled like a parts list. */
export function Facts({ rows }: { readonly rows: readonly { readonly label: string; readonly value: ReactNode }[] }) {
  return (
    <dl className="border-t border-rule">
      {rows.map((row) => (
        <div key={row.label} className="flex flex-wrap items-baseline justify-between gap-x-4 border-b border-rule py-1.5">
          <dt className="text-ink-soft">{row.label}</dt>
          <dd className="text-right font-medium">{row.value}</dd>
        </div>
      ))}
    </dl>
  );
}
