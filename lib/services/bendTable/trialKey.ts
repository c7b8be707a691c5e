import type { MaterialFacts } from "@/bending/handbook/material";
import type { BendTrial } from "@/bending/shopTable/bendTrial";
import { shopTable } from "@/bending/shopTable/shopTable";

/** The key of the cell that a trial is filed under. */
export const trialKey = (trial: BendTrial, material: MaterialFacts): string | null =>
  shopTable([trial], () => material).cells[0]?.key ?? null;
