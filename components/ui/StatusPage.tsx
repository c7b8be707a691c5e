import type { ReactNode } from "react";

/** A whole page that only says where one has got to, and the way on. */
export function StatusPage({ code, title, children }: { readonly code: string; readonly title: string; readonly children: ReactNode }) {
  return (
    <main id="content" className="mx-auto flex min-h-[70dvh] max-w-xl flex-col justify-center px-6 py-16">
      <div className="border-y border-t-2 border-ink py-4">
        <p className="caption num">{code}</p>
        <h1 className="text-2xl font-semibold tracking-tight">{title}</h1>
      </div>
      <div className="mt-4 space-y-4 text-ink-soft">{children}</div>
    </main>
  );
}
