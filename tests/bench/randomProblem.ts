import type { OrderProblem } from "@/bending/order/orderProblem";
import { poseOf } from "@/bending/order/pose";

/** A made-up order problem that is the same every time: two fronts a bend, a fifth of them after another bend only. */
export function randomProblem(bends: number): OrderProblem {
  let state = 20_240_229;
  const random = (below: number) => {
    state = (state * 48_271) % 2_147_483_647;
    return state % below;
  };
  const moves = Array.from({ length: bends }, (_, bend) => {
    const [up, quarter] = [random(2) === 0 ? 1 as const : -1 as const, random(2)];
    return [0, 2].map((half) => {
      const angle = ((quarter + half) * Math.PI) / 2;
      return { mask: 1 << bend, pose: poseOf(up, Math.cos(angle), Math.sin(angle)) };
    });
  }).flat();
  const needs = moves.map((move, index) => (random(5) === 0 ? (1 << random(bends)) & ~move.mask & ((1 << Math.floor(index / 2)) - 1) : 0));
  const gauges = moves.map(() => random(4) + 1);
  return {
    bends, moves, stations: 1,
    times: { flip: 4, turn: 3, stroke: 4, gaugeMove: 1.5 },
    walk: () => 0,
    option: (move, formed) => {
      const need = needs[move] ?? 0;
      return (formed & need) === need ? { gauge: gauges[move] ?? 0, demerit: 0 } : null;
    },
  };
}
