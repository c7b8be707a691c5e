import type { Mm } from "../core/units";
import type { PartModel } from "../part/partModel";
import type { Hit } from "../clearance/hit";
import type { Drift } from "./drift";
import type { Repeats } from "./gaugedStep";
import type { PartDimension } from "./partDimension";

export interface AskedLength {
  readonly dimension: PartDimension;
  readonly tolerance: Mm;
}

/**
 * How far each length asked for may miss when the stroke that decides it is gauged so that the bends formed between line and fingers
 * move the touched place by `drift`: its own stop, and each of those bends with one stop and its angle, as if it had been set on
 * its own; 0 for lengths that the stroke does not decide. A bend at the length's other end counts when it is formed already, and cancels when the fingers touch what it carries.
 * That is what can be said before the order is known; what the whole order does is added up by `partTolerances`.
 */
export function missWhenGauged(part: PartModel, hit: Hit, drift: readonly Drift[], repeats: Repeats, asked: readonly AskedLength[]): readonly number[] {
  const first = part.bends[hit.bends[0] ?? -1];
  const mine = asked.map(({ dimension }) => endsOf(dimension).filter((bend) => hit.bends.includes(bend)));
  if (!first || mine.every((bends) => bends.length === 0)) return asked.map(() => 0);
  // The line moves against the depth when the child lies behind, with it when the parent does.
  const sign = hit.front === first.parent ? -1 : 1;
  return asked.map(({ dimension }, i) => {
    const bend = mine[i]?.[0];
    if (bend === undefined) return 0;
    const grows = (index: number) => (part.bends[index]?.parent === dimension.face ? 1 : -1);
    const other = endsOf(dimension).find((end) => end !== bend && !hit.bends.includes(end) && ((hit.formed >> end) & 1) === 1);
    const lines = new Map(drift.map(({ bend: index, shift }) => [index, -grows(bend) * sign * shift]));
    if (other !== undefined) lines.set(other, (lines.get(other) ?? 0) + grows(other));
    const stops = [...lines.values()].reduce((sum, value) => sum + Math.abs(value), 1);
    return stops * repeats.gauge + drift.reduce((sum, { turn }) => sum + Math.abs(turn), 0) * repeats.angle;
  });
}

const endsOf = ({ from, to }: PartDimension): readonly number[] => [...from, ...to].flatMap((end) => (end.at === "outside" ? [end.bend] : []));
