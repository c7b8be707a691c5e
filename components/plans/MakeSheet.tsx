"use client";
import { FileText } from "lucide-react";
import Link from "next/link";
import { useRouter } from "next/navigation";
import { Button } from "@/components/ui/Button";
import { buttonClasses } from "@/components/ui/buttonClasses";
import { useToast } from "@/components/ui/ToastProvider";
import { useCreateSheet } from "@/lib/queries/sheets";
import type { SheetListItem } from "@/lib/schemas/views";

/** Makes a draft of the setup sheet, or leads to the sheets that this plan already has. */
export function MakeSheet({ planId, sheets }: { readonly planId: string; readonly sheets: readonly SheetListItem[] }) {
  const router = useRouter();
  const toast = useToast();
  const create = useCreateSheet();
  const make = (): void => create.mutate(planId, {
    onSuccess: (sheet) => router.push(`/sheets/${sheet.id}`),
    onError: (problem) => toast("wrong", "No setup sheet was made", problem.message),
  });
  return (
    <>
      {sheets.map((sheet) => <Link key={sheet.id} href={`/sheets/${sheet.id}`} className={buttonClasses("plain")}>Sheet {sheet.number} ({sheet.state})</Link>)}
      <Button icon={<FileText aria-hidden />} busy={create.isPending} onClick={make} look={sheets.length > 0 ? "plain" : "primary"}>Make setup sheet</Button>
    </>
  );
}
