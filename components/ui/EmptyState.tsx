import type { ReactNode } from "react";

/** Nothing here, why, and what to do next. */
export function EmptyState({ title, children, action }: { readonly title: ReactNode; readonly children?: ReactNode; readonly action?: ReactNode }) {
  return (
    <div className="flex flex-col items-center gap-3 border border-dashed border-rule-strong px-6 py-10 text-center">
      <svg aria-hidden viewBox="0 0 96 32" className="h-8 w-24 text-steel-400" fill="none" stroke="currentColor">
        <path d="M8 24h26a6 6 0 0 0 6-6V8M40 8" strokeWidth="3" />
        <path d="M52 6v20M56 16h36" strokeDasharray="9 3 2 3" />
      </svg>
      <p className="text-lg font-semibold">{title}</p>
      {children === undefined ? null : <div className="max-w-prose text-ink-soft">{children}</div>}
      {action === undefined ? null : <div className="mt-1">{action}</div>}
    </div>
  );
}
