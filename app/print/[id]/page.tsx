import type { Metadata } from "next";
import { headers } from "next/headers";
import { notFound } from "next/navigation";
import { PrintBar } from "@/components/sheets/PrintBar";
import { SheetPaper } from "@/components/sheets/SheetPaper";
import { SheetState } from "@/components/sheets/SheetState";
import { SheetQr } from "@/components/sheets/SheetQr";
import { publicAddress } from "@/lib/api/publicAddress";
import { orDatabaseLost } from "@/lib/auth/orDatabaseLost";
import { requirePage } from "@/lib/auth/requirePage";
import { idParams } from "@/lib/schemas/idParams";
import { getSheet } from "@/lib/services/sheets/getSheet";
import { releasedText } from "@/lib/sheet/releasedText";

export const metadata: Metadata = { title: "Print a setup sheet" };

/** The sheet on A4, as the printer gets it. Those who work from sheets see released ones alone. */
export default async function PrintPage({ params }: { readonly params: Promise<{ id: string }> }) {
  const person = await requirePage("/print/[id]");
  const asked = idParams.safeParse(await params);
  if (!asked.success) notFound();
  const found = await orDatabaseLost(getSheet(person, asked.data.id));
  if (!found.ok) notFound();
  const sheet = found.value;
  const address = `${publicAddress(await headers())}/floor/${sheet.id}`;
  return (
    <main id="content" className="print-page mx-auto max-w-[210mm] bg-white p-[10mm] print:max-w-none print:p-0">
      <PrintBar id={sheet.id} />
      <SheetState state={sheet.state} released={releasedText(sheet)} />
      <SheetPaper view={sheet.view} code={<SheetQr address={address} />} />
    </main>
  );
}
