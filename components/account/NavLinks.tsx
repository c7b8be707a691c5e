"use client";
import Link from "next/link";
import { usePathname } from "next/navigation";
import { classes } from "@/components/ui/classes";

export interface NavLink { readonly href: string; readonly label: string }

export function NavLinks({ links }: { readonly links: readonly NavLink[] }) {
  const path = usePathname();
  return (
    <nav aria-label="Main">
      <ul className="flex flex-wrap">
        {links.map(({ href, label }) => {
          const here = path === href || path.startsWith(`${href}/`);
          return (
            <li key={href}>
              <Link href={href} aria-current={here ? "page" : undefined}
                className={classes("flex min-h-12 items-center border-b-[3px] px-3 font-medium hover:bg-wash", here ? "border-accent text-ink" : "border-transparent text-ink-soft")}>
                {label}
              </Link>
            </li>
          );
        })}
      </ul>
    </nav>
  );
}
