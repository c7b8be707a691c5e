import path from "node:path";
import { Font } from "@react-pdf/renderer";

let done = false;

/** Barlow and IBM Plex Mono for PDFs; latin and latin-ext stand in files of their own, so each is a family. */
export function registerSheetFonts(): void {
  if (done) return;
  const file = (name: string): string => path.join(process.cwd(), "public", "fonts", `${name}.woff`);
  for (const subset of ["latin", "latin-ext"] as const) {
    const ending = subset === "latin" ? "" : " ext";
    Font.register({ family: `Barlow${ending}`, fonts: [400, 600, 700].map((weight) => ({ src: file(`barlow-${subset}-${weight}-normal`), fontWeight: weight })) });
    Font.register({ family: `Plex Mono${ending}`, fonts: [400, 600].map((weight) => ({ src: file(`ibm-plex-mono-${subset}-${weight}-normal`), fontWeight: weight })) });
  }
  Font.registerHyphenationCallback((word) => [word]);
  done = true;
}
