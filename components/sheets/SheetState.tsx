import type { SheetState as State } from "@/lib/schemas/views";

/** Says on paper what the sheet is worth. */
export function SheetState({ state, released }: { readonly state: State; readonly released: string | null }) {
  if (state === "released") return <p className="mb-2 text-sm text-ink-soft">Released {released}</p>;
  return <p className="mb-2 border-2 border-brick px-3 py-1 text-lg font-bold text-brick-ink">{state === "draft" ? "DRAFT: not for the floor" : "SUPERSEDED: do not work from this sheet"}</p>;
}
