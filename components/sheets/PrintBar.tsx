"use client";
import { FileDown, Printer } from "lucide-react";
import { Button } from "@/components/ui/Button";
import { buttonClasses } from "@/components/ui/buttonClasses";

/** On screen only: print, or take the PDF. */
export function PrintBar({ id }: { readonly id: string }) {
  return (
    <div className="mb-4 flex gap-2 print:hidden">
      <Button icon={<Printer aria-hidden />} onClick={() => window.print()}>Print</Button>
      <a href={`/api/sheets/${id}/pdf`} className={buttonClasses("plain")}><FileDown aria-hidden />PDF</a>
    </div>
  );
}
