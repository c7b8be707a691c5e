"use client";
import Link from "next/link";
import { Button } from "@/components/ui/Button";
import { StatusPage } from "@/components/ui/StatusPage";
import { databaseLostDigest } from "@/lib/auth/databaseLostDigest";

export default function ErrorPage({ error }: { readonly error: Error & { digest?: string } }) {
  const databaseLost = error.digest === databaseLostDigest;
  return (
    <StatusPage code={databaseLost ? "503" : "500"} title={databaseLost ? "The database cannot be reached just now" : "This page could not be shown"}>
      <p>{databaseLost ? "Nothing was half saved, and what you had saved is still there. Try again in a minute." : "Something went wrong on our side, not yours. What you had saved is still there."}</p>
      {error.digest === undefined || databaseLost ? null : <p>When you report it, give this number: <span className="num">{error.digest}</span></p>}
      <div className="flex flex-wrap items-center gap-4">
        {/* Asks the server once more; to draw again what it sent would show the same. */}
        <Button onClick={() => window.location.reload()}>Try again</Button>
        <Link href="/" className="text-accent-ink underline underline-offset-2">Go to your start page</Link>
      </div>
    </StatusPage>
  );
}
