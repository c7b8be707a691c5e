export interface TextFile {
  readonly text: string;
  /** Said when it is not plain UTF-8. */
  readonly note?: string;
}

/** A file as text: UTF-8, UTF-16 by its mark, else the one-byte code that spreadsheets of Western Europe save (Windows-1252). */
export async function readTextFile(file: Blob): Promise<TextFile> {
  const bytes = new Uint8Array(await file.arrayBuffer());
  const wide = bytes[0] === 0xff && bytes[1] === 0xfe ? "utf-16le" : bytes[0] === 0xfe && bytes[1] === 0xff ? "utf-16be" : null;
  if (wide !== null) return { text: new TextDecoder(wide).decode(bytes), note: "The file was read as UTF-16." };
  try {
    return { text: new TextDecoder("utf-8", { fatal: true }).decode(bytes) };
  } catch {
    return { text: new TextDecoder("windows-1252").decode(bytes), note: "The file is not UTF-8; it was read as Windows-1252. Look whether umlauts and accents came out right." };
  }
}
