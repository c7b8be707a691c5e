/** A group of a DXF file: its code, its value and the line of the file on which the value stands (from 1). */
export interface DxfTag {
  readonly code: number;
  readonly value: string;
  readonly line: number;
}

export interface TagReader {
  /** The next group, or null at the end or where the file breaks. */
  readonly next: () => DxfTag | null;
  /** Why there is no next one, when that is not the file's proper end. */
  readonly problem: () => { readonly line: number; readonly message: string } | null;
}

/** Reads groups one by one without holding them all; a comment (code 999) is skipped. */
export function createTagReader(whole: string): TagReader {
  // Old files end their lines with a carriage return alone.
  const text = whole.includes("\n") ? whole : whole.replaceAll("\r", "\n");
  let at = text.startsWith("\uFEFF") ? 1 : 0;
  let line = 0;
  let problem: { readonly line: number; readonly message: string } | null = null;
  const readLine = (): string | null => {
    if (at >= text.length) return null;
    const found = text.indexOf("\n", at);
    const end = found < 0 ? text.length : found;
    const value = text.slice(at, text[end - 1] === "\r" ? end - 1 : end);
    at = end + 1;
    line += 1;
    return value;
  };
  const read = (): DxfTag | null => {
    const first = readLine();
    if (first === null) return null;
    const codeText = first.trim();
    if (codeText === "" && text.length - at < 1000 && text.slice(at).trim() === "") return null;
    if (!/^-?\d{1,5}$/.test(codeText)) {
      problem = { line, message: `a group code (a whole number) was expected, but there stands "${codeText.slice(0, 40)}"` };
      return null;
    }
    const value = readLine();
    if (value === null) {
      problem = { line, message: `the file ends in the middle: the value of group ${codeText} was expected` };
      return null;
    }
    return { code: Number(codeText), value, line };
  };
  const next = (): DxfTag | null => {
    if (problem !== null) return null;
    for (let tag = read(); tag !== null; tag = read()) if (tag.code !== 999) return tag;
    return null;
  };
  return { next, problem: () => problem };
}
