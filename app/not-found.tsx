import Link from "next/link";
import { StatusPage } from "@/components/ui/StatusPage";

export const metadata = { title: "Not found" };

export default function NotFound() {
  return (
    <StatusPage code="404" title="There is nothing at this address">
      <p>It may have been deleted, or the address was typed wrongly.</p>
      <p><Link href="/" className="text-accent-ink underline underline-offset-2">Go to your start page</Link></p>
    </StatusPage>
  );
}
