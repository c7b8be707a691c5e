"use client";
import Link from "next/link";
import { usePathname } from "next/navigation";
import { classes } from "@/components/ui/classes";

const places = [
  { href: "/bend-table", label: "Values" },
  { href: "/bend-table/coverage", label: "Coverage" },
  { href: "/bend-table/trials", label: "Trials" },
  { href: "/bend-table/instruments", label: "Instruments" },
] as const;

/** The pages of the bend table, side by side. */
export function BendTableTabs() {
  const path = usePathname();
  return (
    <nav aria-label="Bend table" className="mb-5">
      <ul className="flex flex-wrap gap-x-6 border-b border-rule-strong">
        {places.map(({ href, label }) => (
          <li key={href}>
            <Link href={href} aria-current={path === href ? "page" : undefined}
              className={classes("-mb-px flex min-h-10 items-center border-b-2 px-0.5 font-medium hover:text-ink", path === href ? "border-accent text-ink" : "border-transparent text-ink-soft")}>
              {label}
            </Link>
          </li>
        ))}
      </ul>
    </nav>
  );
}
