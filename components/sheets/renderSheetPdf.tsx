import { renderToBuffer } from "@react-pdf/renderer";
import type { ComponentProps } from "react";
import { registerSheetFonts } from "./registerSheetFonts";
import { SheetPdf } from "./SheetPdf";

/** The finished file. */
export async function renderSheetPdf(props: ComponentProps<typeof SheetPdf>): Promise<Uint8Array<ArrayBuffer>> {
  registerSheetFonts();
  return new Uint8Array(await renderToBuffer(<SheetPdf {...props} />));
}
