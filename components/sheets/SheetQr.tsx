import { qrPath } from "@/lib/sheet/qrPath";

/** Leads from paper to the sheet as it stands now. */
export function SheetQr({ address }: { readonly address: string }) {
  const { path, size } = qrPath(address);
  return (
    <figure className="w-24 shrink-0 text-center">
      <svg viewBox={`0 0 ${size} ${size}`} role="img" aria-label={`QR code: ${address}`} shapeRendering="crispEdges" className="w-full bg-white"><path d={path} fill="#000" /></svg>
      <figcaption className="text-[0.625rem] leading-tight text-ink-soft">the sheet as it stands now</figcaption>
    </figure>
  );
}
