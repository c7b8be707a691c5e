import QRCode from "qrcode";

/** A QR code as one SVG path over a square of `size` modules, the quiet zone of four (ISO/IEC 18004) included. */
export function qrPath(text: string): { readonly path: string; readonly size: number } {
  const { modules } = QRCode.create(text, { errorCorrectionLevel: "M" });
  const quiet = 4;
  let path = "";
  for (let row = 0; row < modules.size; row++) {
    for (let column = 0; column < modules.size; column++) {
      if (modules.get(row, column)) path += `M${column + quiet} ${row + quiet}h1v1h-1z`;
    }
  }
  return { path, size: modules.size + 2 * quiet };
}
