import type { BendDirection } from "@/bending/part/partDocument";

/** Up and down are told apart by line style and by letter, never by colour alone. */
export const bendLook: Readonly<Record<BendDirection, { readonly dash: string; readonly letter: string; readonly says: string }>> = {
  up: { dash: "12 3 2 3", letter: "U", says: "chain line: bend up" },
  down: { dash: "5 4", letter: "D", says: "dashed line: bend down" },
};
