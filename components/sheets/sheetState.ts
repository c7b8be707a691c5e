import type { StateTone } from "@/components/ui/StateMark";
import type { SheetState } from "@/lib/schemas/views";

export const sheetState: Record<SheetState, { readonly tone: StateTone; readonly sentence: string }> = {
  draft: { tone: "draft", sentence: "A draft: it is not on the floor, and follows the rack until it is released." },
  released: { tone: "good", sentence: "Released and frozen: what the operator works from." },
  superseded: { tone: "off", sentence: "A newer sheet for this part and brake has taken its place. Do not work from it." },
};
