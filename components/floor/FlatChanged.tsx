import { TriangleAlert } from "lucide-react";
import { flatChangeText } from "@/lib/format/flatChangeText";
import type { FlatChange } from "@/lib/schemas/views";

/** Told before the first stroke and at the first part: the sheet holds, and the blank may be a little off. */
export function FlatChanged({ change }: { readonly change: FlatChange }) {
  const { then, now } = flatChangeText(change);
  return (
    <div role="status" className="flex items-start gap-4 border-y-2 border-amber bg-amber-wash px-5 py-3 text-xl leading-snug">
      <TriangleAlert aria-hidden className="mt-0.5 size-7 shrink-0 text-amber-ink" />
      <div>
        <p className="font-semibold">The flat would now be <span className="num">{now}</span>; this sheet has <span className="num">{then}</span>. Measure the first part well, and ask the engineer before more blanks are cut.</p>
        <p className="text-ink-soft">{change.why.join("; ")}</p>
      </div>
    </div>
  );
}
