import type { DieOpening } from "@/bending/handbook/dieOpening";
import { openingBetweenTops } from "@/bending/handbook/openingBetweenTops";
import { formatQuantity } from "@/lib/format/formatQuantity";
import type { Answer } from "./answer";
import { figures } from "./figures";
import type { Question } from "./question";
import { readDie } from "./readDie";

export interface Reading {
  readonly die: DieOpening;
  readonly title: string;
  /** The V between the arc tops; its own answer where it has to be worked out. */
  readonly tops: number;
  readonly conversion: readonly Answer[];
}

/** The V that was typed, read in each of the two ways that Vs are named by: the chosen one first. */
export function bothReadings(q: Question): readonly Reading[] {
  const ways = q.choices.vm === "between-tops" ? ["between-tops", "between-corners"] as const : ["between-corners", "between-tops"] as const;
  return ways.map((measured, i) => {
    const die = readDie(measured, q.vOpening, q.number);
    const tops = openingBetweenTops(die).opening;
    const size = formatQuantity(q.vOpening, "length", q.choices.u);
    const name = measured === "between-tops" ? "between the tops of the shoulder arcs" : "between the sharp corners";
    return {
      die, tops, title: i === 0 ? `V ${size} ${name}, as chosen` : `If ${size} were taken ${name}`,
      conversion: measured === "between-tops" ? [] : [{
        label: "The same V between the arc tops", kind: "length", value: tops,
        formula: { text: "V_t = V + 2 · r_d · tan([90° − δ / 2 | 2])", of: { V: figures.length(q.vOpening), r_d: figures.length(die.shoulderRadius), δ: figures.angle(q.number("da")) } },
        source: "derived: the arc's tangent length on the die's top",
      }],
    };
  });
}
