import type { Move } from "../order/collectMoves";
import type { PartModel } from "../part/partModel";
import { drawnBend } from "../strokes/drawnIds";
import type { BendWish } from "./bendWish";
import type { FitProblem } from "./situation";
import type { ToolPair } from "./toolPair";

/** A tool that was not asked for is told last: what is wrong with the one that was asked for comes first. */
const NOT_ASKED_FOR = 1e7;

/** Leaves out the fronts and tools that a person did not ask for. `part`: every stroke a bend of its own; `drawn`: as the wishes name it. */
export function heedWishes(part: PartModel, drawn: PartModel, wishes: readonly BendWish[]) {
  const wishOf = (index: number): BendWish | undefined => wishes.find(({ bend }) => bend === drawnBend(part.bends[index]?.id ?? ""));
  return {
    frontAllowed: ({ bends, front }: Move): boolean => bends.every((index) => {
      const wish = wishOf(index);
      const own = drawn.bends.find(({ id }) => id === wish?.bend);
      if (wish?.front === undefined || own === undefined) return true;
      return (drawn.faces[own.parent]?.id === wish.front) === (front === part.bends[index]?.parent);
    }),
    misfit: (index: number, { punch, die }: ToolPair): FitProblem | null => {
      const wish = wishOf(index);
      const [tool, asked] = wish?.punch !== undefined && wish.punch !== punch.id ? [punch, wish.punch] : wish?.die !== undefined && wish.die !== die.id ? [die, wish.die] : [null, ""];
      return tool === null ? null : { kind: "tool-choice", tools: [asked], off: NOT_ASKED_FOR, message: `bend ${wish?.bend ?? ""} is to be made with ${asked}, not with ${tool.id}` };
    },
  };
}
