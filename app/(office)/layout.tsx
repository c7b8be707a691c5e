import type { ReactNode } from "react";
import { Shell } from "@/components/account/Shell";
import { pageAccess } from "@/lib/auth/accessTable";
import { currentPerson } from "@/lib/auth/currentPerson";
import { mayEnter } from "@/lib/auth/mayEnter";

const places = [
  { href: "/parts", label: "Parts" },
  { href: "/plans", label: "Plans" },
  { href: "/sheets", label: "Setup sheets" },
  { href: "/floor", label: "At the brake" },
  { href: "/tools", label: "Tools" },
  { href: "/machines", label: "Brakes" },
  { href: "/materials", label: "Materials" },
  { href: "/calculator", label: "Calculator" },
  { href: "/bend-table", label: "Bend table" },
  { href: "/settings", label: "Settings" },
  { href: "/people", label: "People" },
  { href: "/activity", label: "Activity" },
] as const;

/** Shows only; each page asks for itself whether this person may see it. */
export default async function OfficeLayout({ children }: { readonly children: ReactNode }) {
  const person = await currentPerson().catch(() => null);
  if (person === null) return <>{children}</>;
  const links = places.filter(({ href }) => mayEnter(person.role, pageAccess[href]));
  return <Shell links={links} person={{ name: person.name, role: person.role }}>{children}</Shell>;
}
