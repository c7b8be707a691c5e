import type { Metadata } from "next";
import Link from "next/link";
import { SignOutButton } from "@/components/account/SignOutButton";
import { FloorList } from "@/components/floor/FloorList";
import { can } from "@/lib/auth/permissions";
import { requirePage } from "@/lib/auth/requirePage";

export const metadata: Metadata = { title: "At the brake" };

export default async function FloorPage() {
  const { name, role } = await requirePage("/floor");
  const office = can(role, "sheets:drafts") || can(role, "tools:read");
  return <FloorList name={name} home={<>{office ? <Link href={can(role, "sheets:drafts") ? "/sheets" : "/tools"} className="flex min-h-16 items-center px-3 underline">{can(role, "sheets:drafts") ? "Office" : "Tools"}</Link> : null}<Link href="/calculator" className="flex min-h-16 items-center px-3 underline">Calculator</Link><span className="[&_button]:min-h-16 [&_button]:px-5 [&_button]:text-lg"><SignOutButton /></span></>} />;
}
