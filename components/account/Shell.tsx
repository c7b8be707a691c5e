import Link from "next/link";
import type { ReactNode } from "react";
import { Mark } from "@/components/ui/Mark";
import { Ruler } from "@/components/ui/Ruler";
import type { Role } from "@/lib/schemas/role";
import { NavLinks, type NavLink } from "./NavLinks";
import { SignOutButton } from "./SignOutButton";

interface ShellProps {
  readonly links: readonly NavLink[];
  readonly person: { readonly name: string; readonly role: Role };
  readonly children: ReactNode;
}

/** The office around every page: the name, the places that this role works in, who is signed in. */
export function Shell({ links, person, children }: ShellProps) {
  return (
    <>
      <a href="#content" className="sr-only z-50 bg-ink px-4 py-2 text-paper focus:not-sr-only focus:absolute focus:top-2 focus:left-2">Skip to the content</a>
      <header className="border-b border-ink bg-paper print:hidden">
        <div className="mx-auto flex max-w-[100rem] flex-wrap items-center gap-x-6 px-6">
          <Link href="/" className="flex min-h-12 items-center gap-2.5 text-lg font-semibold tracking-tight">
            <Mark className="size-6" />Foldwright
          </Link>
          <NavLinks links={links} />
          <div className="ml-auto flex items-center gap-4 py-1.5">
            <p className="text-right leading-tight">
              <span className="block font-medium">{person.name}</span>
              <span className="caption block">{person.role}</span>
            </p>
            <SignOutButton />
          </div>
        </div>
        <Ruler className="block opacity-70" />
      </header>
      <main id="content" tabIndex={-1} className="mx-auto max-w-[100rem] px-6 py-6 outline-none">{children}</main>
    </>
  );
}
