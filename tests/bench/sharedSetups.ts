import type { Interval } from "@/bending/geometry/interval";
import { sharedSetup, type SharedSetup } from "@/bending/setup/shared/sharedSetup";
import type { SharedWish } from "@/bending/setup/shared/sharedWish";
import { planCorpus } from "../corpus/planCorpus";

/** A linear congruential generator (Numerical Recipes, from memory): the same bends in every run. */
function numbers(seed: number): () => number {
  let state = seed;
  return () => (state = (Math.imul(state, 1664525) + 1013904223) >>> 0) / 2 ** 32;
}

/** Lengths of the sides that boxes of a day have, mm: each asks for a run of its own. */
const SIDES = [25, 50, 75, 100, 125, 150, 180, 210, 250, 300] as const;
const FREE: Interval = [-3100, 3100];

/**
 * A day's bends: sides of boxes between flanges that stand already, with a few millimetres beside the line, some with a flange
 * at one end only, and free ones; most on either punch, some on the relieved one alone, on one to three dies.
 */
export function dayOfBends(count: number, sides: number): readonly SharedWish[] {
  const random = numbers(count * 100 + sides);
  return Array.from({ length: count }, (_, index): SharedWish => {
    const box = index < sides ? index : Math.floor(random() * sides);
    const lineLength = (SIDES[box] ?? 300) - Math.floor(random() * 4);
    const half = lineLength / 2;
    const kind = index < sides ? 0 : random();
    const room = () => half + 2 + Math.floor(random() * 4);
    const punchWindow: Interval = kind < 0.6 ? [-room(), room()] : kind < 0.8 ? [-room(), FREE[1]] : FREE;
    const punches = random() < 0.3 ? ["P88-relieved"] : ["P88", "P88-relieved"];
    const first = Math.floor(random() * 2);
    const dies = ["V8", "V12", "V16"].slice(first, first + 2);
    return {
      id: `bend ${index + 1}`, lineLength, forceKN: lineLength / 5, sheet: [-half - 20, half + 20],
      ways: punches.flatMap((punch) => dies.map((die) => ({ punch, die, punchWindow, dieWindow: FREE }))),
    };
  });
}

/** On the corpus's brake, with every tool of it three times. */
export function dayOnOneBed(wishes: readonly SharedWish[]): SharedSetup {
  const { tools, machine } = planCorpus("tray");
  const stock = tools.map((tool) => ({ ...tool, pieces: [1, 2, 3].flatMap((set) => tool.pieces.map((piece) => ({ ...piece, id: `${piece.id}/${set}` }))).sort((a, b) => b.length - a.length) }));
  return sharedSetup(wishes, stock, machine);
}
