/** Text of a drawing without its formatting codes (`\A1;`, `{\fArial;..}`, `%%c`, `\U+00E4`), one line. */
export function readText(value: string): string {
  return value
    .replace(/\\U\+([0-9A-Fa-f]{4})/g, (_, hex: string) => String.fromCharCode(parseInt(hex, 16)))
    .replace(/%%([cdp])/gi, (_, sign: string) => ({ c: "Ø", d: "°", p: "±" })[sign.toLowerCase()] ?? "")
    .replace(/\\P/g, " ")
    .replace(/\\[A-Za-z][^;\\{}]{0,80};/g, "")
    .replace(/[{}]/g, "")
    .trim();
}
