import Link from "next/link";
import { SignOutButton } from "@/components/account/SignOutButton";
import { StatusPage } from "@/components/ui/StatusPage";
import { buttonClasses } from "@/components/ui/buttonClasses";
import { requirePage } from "@/lib/auth/requirePage";

export const metadata = { title: "Not for your role" };

export default async function ForbiddenPage() {
  const person = await requirePage("/forbidden");
  return (
    <StatusPage code="403" title="That page is not part of your work">
      <p>You are signed in as {person.name}, {person.role}. If you need it for your work, ask the manager to change your role.</p>
      <div className="flex flex-wrap gap-3">
        <Link href="/" className={buttonClasses("primary", "small")}>Go to your start page</Link>
        <SignOutButton />
      </div>
    </StatusPage>
  );
}
