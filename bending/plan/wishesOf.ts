import type { FieldProblem } from "../core/problem";
import { fail, ok, type Result } from "../core/result";
import { mmPer } from "../core/units";
import type { Interval } from "../geometry/interval";
import type { SharedWay, SharedWish } from "../setup/shared/sharedWish";
import type { PlanDocument } from "./planDocument";

/**
 * What the steps of plans ask of one bed that serves them all, each with the tools that its plan chose and, where they are given (by plan, then
 * by step, as `waysOf` finds them), with others. A wish is named after its part and
 * bends; parts of the same name are told apart by a number. A plan without steps, or of before rooms were kept, is a problem
 * at its place in the list.
 */
export function wishesOf(plans: readonly PlanDocument[], others: readonly (readonly (readonly SharedWay[])[])[] = []): Result<readonly SharedWish[], readonly FieldProblem[]> {
  const problems = plans.flatMap(({ steps, part }, index): readonly FieldProblem[] => {
    if (steps.length === 0) return [{ path: `[${index}].steps`, message: `the plan of ${part} has no steps` }];
    const without = steps.filter(({ room }) => room === undefined).map(({ bends }) => bends.join("+"));
    if (without.length === 0) return [];
    return [{ path: `[${index}].steps`, message: `the plan of ${part} does not say where tools may stand at ${without.join(", ")}; plan it again, and where its tools stand apart between tabs set it up by itself` }];
  });
  if (problems.length > 0) return fail(problems);
  return ok(plans.flatMap(({ part, steps, units }, index) => {
    const before = plans.slice(0, index).filter((other) => other.part === part).length;
    const name = before === 0 ? part : `${part} (${before + 1})`;
    const inMm = ([from, to]: readonly [number, number]): Interval => [from * mmPer(units), to * mmPer(units)];
    return steps.flatMap(({ bends, bendZ, room, punch, die, forceKN, hit }, step): readonly SharedWish[] => (room === undefined ? [] : [{
      id: `${name}: ${bends.join("+")}${hit ? ` ${hit.number}/${hit.of}` : ""}`,
      lineLength: (bendZ[1] - bendZ[0]) * mmPer(units),
      sheet: inMm(room.sheet),
      forceKN,
      ways: [
        { punch, die, punchWindow: inMm(room.punch), dieWindow: inMm(room.die) },
        ...(others[index]?.[step] ?? []).filter((way) => way.punch !== punch || way.die !== die),
      ],
    }]));
  }));
}
