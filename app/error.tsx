"use client";
import Link from "next/link";
import { Button } from "@/components/ui/Button";
import { StatusPage } from "@/components/ui/StatusPage";

export default function ErrorPage({ error, reset }: { readonly error: Error & { digest?: string }; readonly reset: () => void }) {
  return (
    <StatusPage code="500" title="This page could not be shown">
      <p>Something went wrong on our side, not yours. What you had saved is still there.</p>
      {error.digest === undefined ? null : <p>When you report it, give this number: <span className="num">{error.digest}</span></p>}
      <div className="flex flex-wrap items-center gap-4">
        <Button onClick={reset}>Try again</Button>
        <Link href="/" className="text-accent-ink underline underline-offset-2">Go to your start page</Link>
      </div>
    </StatusPage>
  );
}
