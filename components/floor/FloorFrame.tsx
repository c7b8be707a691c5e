import Link from "next/link";
import type { ReactNode } from "react";

/** The head of every screen at the brake. */
export function FloorFrame({ title, aside, back, children }: { readonly title: ReactNode; readonly aside?: ReactNode; readonly back?: { readonly href: string; readonly label: string }; readonly children: ReactNode }) {
  return (
    <div className="flex min-h-dvh flex-col">
      <header className="flex min-h-16 items-center gap-4 border-b border-rule px-4">
        {back ? <Link href={back.href} className="flex min-h-16 min-w-16 items-center border-r border-rule pr-4 text-xl font-medium">{back.label}</Link> : null}
        <h1 className="min-w-0 grow truncate text-2xl font-semibold">{title}</h1>
        {aside}
      </header>
      {children}
    </div>
  );
}
