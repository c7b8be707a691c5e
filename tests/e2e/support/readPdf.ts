import { getDocument } from "pdfjs-dist/legacy/build/pdf.mjs";

/** The words of a PDF in reading order, without blanks: where a line breaks is the layout's affair. */
export async function readPdf(file: Uint8Array): Promise<{ readonly pages: number; readonly words: string }> {
  const pdf = await getDocument({ data: Uint8Array.from(file), useSystemFonts: false }).promise;
  const pages: string[] = [];
  for (let number = 1; number <= pdf.numPages; number += 1) {
    const { items } = await (await pdf.getPage(number)).getTextContent();
    pages.push(items.map((item) => ("str" in item ? item.str : "")).join(""));
  }
  return { pages: pdf.numPages, words: pages.join("").replace(/\s+/g, "") };
}
