import { fail, ok, type Result } from "../../../core/result";

/**
 * The text of a drawing file: UTF-8 where it is that, else Windows 1252 (what DXF before AC1021 is written in as a rule).
 * Binary files are refused by name of what they are.
 */
export function decodeDxf(bytes: Uint8Array): Result<string, string> {
  if (bytes.length === 0) return fail("the file is empty");
  const head = String.fromCharCode(...bytes.subarray(0, 24));
  if (/^AC1\d\d\d/.test(head)) return fail("the file is a binary drawing (it begins with " + head.slice(0, 6) + "); save it as DXF text (ASCII) and read that");
  if (/^\w+ Binary DXF/.test(head)) return fail("the file is a binary DXF; save it as DXF text (ASCII) and read that");
  if (bytes.subarray(0, 4096).includes(0)) return fail("the file is not text: it holds zero bytes where group codes were expected");
  try {
    return ok(new TextDecoder("utf-8", { fatal: true }).decode(bytes));
  } catch {
    return ok(new TextDecoder("windows-1252").decode(bytes));
  }
}
