import type { ReactNode } from "react";

interface PageHeaderProps {
  /** The kind of sheet: Part, Tool, Parts. */
  readonly kicker?: ReactNode;
  readonly title: ReactNode;
  /** One plain sentence under the title. */
  readonly summary?: ReactNode;
  /** The cells of the title block. */
  readonly facts?: readonly { readonly label: string; readonly value: ReactNode }[];
  readonly actions?: ReactNode;
}

/** The title block of a drawing, put at the head of a page. */
export function PageHeader({ kicker, title, summary, facts = [], actions }: PageHeaderProps) {
  return (
    <header className="mb-6 border-y border-t-2 border-ink print:hidden">
      <div className="flex flex-wrap items-end justify-between gap-x-8 gap-y-3 py-3">
        <div className="min-w-0">
          {kicker === undefined ? null : <p className="caption">{kicker}</p>}
          <h1 className="text-2xl leading-tight font-semibold tracking-tight break-words">{title}</h1>
          {summary === undefined ? null : <p className="mt-0.5 max-w-prose text-ink-soft">{summary}</p>}
        </div>
        {actions === undefined ? null : <div className="flex flex-wrap items-center gap-2">{actions}</div>}
      </div>
      {facts.length === 0 ? null : (
        <dl className="flex flex-wrap border-t border-rule-strong">
          {facts.map((fact) => (
            <div key={fact.label} className="min-w-28 border-r border-rule-strong py-1.5 pr-5 pl-3 first:pl-0 last:border-r-0">
              <dt className="caption">{fact.label}</dt>
              <dd className="font-medium">{fact.value}</dd>
            </div>
          ))}
        </dl>
      )}
    </header>
  );
}
