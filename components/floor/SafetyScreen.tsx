import { OctagonAlert, TriangleAlert } from "lucide-react";
import type { SheetView } from "@/lib/sheet/sheetView";

/** What to see to before the first stroke. */
export function SafetyScreen({ view }: { readonly view: SheetView }) {
  const stops = view.cautions.filter((caution) => caution.level === "stop");
  const others = view.cautions.filter((caution) => caution.level !== "stop");
  return (
    <div className="grid grow content-start gap-6 p-5 lg:grid-cols-2">
      <ul className="space-y-3">
        {stops.map((caution) => (
          <li key={caution.text} className="flex items-start gap-4 border-2 border-brick bg-brick-wash p-4 text-[1.7rem] leading-snug font-semibold"><OctagonAlert aria-hidden className="mt-1 size-9 shrink-0 text-brick-ink" />{caution.text}</li>
        ))}
      </ul>
      <ul className="space-y-3">
        {others.map((caution, index) => (
          <li key={index} className="flex items-start gap-4 border-2 border-amber bg-amber-wash p-4 text-xl leading-snug"><TriangleAlert aria-hidden className="mt-0.5 size-7 shrink-0 text-amber-ink" />
            <span>{caution.text}{caution.steps.length > 0 ? ` (bend ${caution.steps.join(", ")})` : ""}</span></li>
        ))}
      </ul>
    </div>
  );
}
