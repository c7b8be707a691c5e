import type { PlanDocument } from "@/bending/plan/planDocument";
import { mmPer } from "@/bending/core/units";
import { createSheetFormat } from "@/lib/sheet/createSheetFormat";

/** A plan that stands beside others. */
export type ComparedPlan = Omit<PlanDocument, "alternatives" | "flat" | "elapsedMs">;

export interface ComparisonRow {
  readonly label: string;
  /** True: the cells hold numbers. */
  readonly number: boolean;
  readonly cells: readonly { readonly lines: readonly string[]; readonly note: string; readonly differs: boolean }[];
}

/** What plans are compared by, each beside the first; what is not as in the first is marked. */
export function comparisonRows(plans: readonly ComparedPlan[]): readonly ComparisonRow[] {
  const first = plans[0];
  if (first === undefined) return [];
  const format = createSheetFormat(first.units);
  const per = mmPer(first.units);
  const row = (label: string, of: (plan: ComparedPlan) => readonly string[]): ComparisonRow => {
    const own = of(first).join("\n");
    return { label, number: false, cells: plans.map((plan) => ({ lines: of(plan), note: "", differs: of(plan).join("\n") !== own })) };
  };
  const figure = (label: string, of: (plan: ComparedPlan) => number, say: (value: number) => string): ComparisonRow => ({
    label, number: true,
    cells: plans.map((plan) => {
      const by = of(plan) - of(first);
      const same = say(of(plan)) === say(of(first));
      return { lines: [say(of(plan))], note: same ? "" : `${by > 0 ? "+" : "−"} ${say(Math.abs(by))}`, differs: !same };
    }),
  });
  const count = (label: string, of: (plan: ComparedPlan) => number): ComparisonRow => figure(label, of, String);
  return [
    figure("Batch in all", ({ seconds }) => seconds.total, format.time),
    figure("A part", ({ seconds }) => seconds.perPart, format.time),
    figure("Setup", ({ seconds }) => seconds.setup, format.time),
    row("Order", ({ steps }) => steps.map(({ bends, front }, index) => `${index + 1}  ${bends.join(" + ")}, ${front} in front`)),
    count("Flips", ({ steps }) => steps.filter(({ handling }) => handling.flip).length),
    count("Turns, quarters", ({ steps }) => steps.reduce((sum, { handling }) => sum + Math.round(handling.turn / 90), 0)),
    count("Moves of the gauge", gaugeMoves),
    row("Stations", ({ stations }) => stations.map(({ id, punch, die, from, to }) => `${id}  ${punch} on ${die}, ${format.place(from * per)} to ${format.place(to * per)}`)),
    count("Pieces on the bed", ({ stations }) => stations.reduce((sum, { punchSections, dieSections }) => sum + [...punchSections, ...dieSections].filter(({ gap }) => gap === undefined).length, 0)),
    row("Tools", ({ steps }) => [...new Set(steps.flatMap(({ punch, die }) => [punch, die]))].sort()),
    row("To mind", ({ cautions }) => (cautions.length === 0 ? ["nothing"] : [...new Set(cautions.map(({ message }) => message))])),
  ];
}

/** Strokes before which the fingers go elsewhere, the first among them. */
function gaugeMoves({ steps }: ComparedPlan): number {
  const at = steps.map(({ gauge }) => JSON.stringify(gauge.fingers));
  return at.filter((place, index) => place !== at[index - 1]).length;
}
