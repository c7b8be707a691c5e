import { redirect } from "next/navigation";
import { homePath } from "@/lib/auth/homePath";
import { requirePage } from "@/lib/auth/requirePage";

/** The front door leads to where the role works. */
export default async function HomePage() {
  const person = await requirePage("/");
  redirect(homePath(person.role));
}
