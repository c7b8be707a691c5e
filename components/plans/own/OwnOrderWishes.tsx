"use client";
import type { BendWish } from "@/bending/plan/bendWish";
import { Select, type SelectOption } from "@/components/ui/Select";
import type { OwnOrder } from "./useOwnOrder";

export interface OwnOrderChoices {
  /** The two faces that may be in front when a stroke is made. */
  readonly fronts: (entry: string) => readonly string[];
  readonly punches: readonly SelectOption[];
  readonly dies: readonly SelectOption[];
}

interface OwnOrderWishesProps {
  readonly own: OwnOrder;
  readonly entry: string;
  /** Counted from 1. */
  readonly step: number;
  readonly wish: BendWish | undefined;
  readonly choices: OwnOrderChoices;
}

/** A select has no empty value: this stands for "whichever is best". */
const ANY = "any";

/** What is asked of a step beside its place; what is left open is chosen by the planner. */
export function OwnOrderWishes({ own, entry, step, wish, choices }: OwnOrderWishesProps) {
  const bind = (key: "front" | "punch" | "die", any: string, options: readonly SelectOption[]) => ({
    id: `own-${key}-${step}`,
    value: wish?.[key] ?? ANY,
    onChange: (value: string) => own.wish(entry, { [key]: value === ANY ? undefined : value }),
    options: [{ value: ANY, label: any }, ...options],
  });
  return (
    <div className="grid gap-2 pr-2 pb-3 pl-18 sm:grid-cols-3">
      <Select {...bind("front", "either", choices.fronts(entry).map((face) => ({ value: face, label: face })))} label="In front" />
      <Select {...bind("punch", "any", choices.punches)} label="Punch" />
      <Select {...bind("die", "any", choices.dies)} label="Die" />
    </div>
  );
}
