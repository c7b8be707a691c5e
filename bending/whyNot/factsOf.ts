import type { PlanDocument } from "../plan/planDocument";
import type { PlanFailure } from "../plan/planFailure";
import type { CheckRequest, PlanRequest } from "../plan/planRequest";
import type { Attempts } from "./createAttempts";
import { situationsOf } from "./situationsOf";
import type { WhyFacts } from "./whyFacts";

/** What the plan's reasons and the failure say about which changes are worth trying, and on which tools and faces. */
export function factsOf(request: PlanRequest | CheckRequest, plan: PlanDocument, failure: PlanFailure | null, attempts: Attempts): WhyFacts {
  const situations = situationsOf(request);
  const strokes = failure?.strokes ?? [];
  const reasons = strokes.flatMap((stroke) => stroke.reasons);
  const named = reasons.flatMap(({ pairs }) => pairs);
  const told = [...plan.reasons, ...reasons].flatMap((reason) => reason.tools);
  const { tools, machine } = request;
  const nearFirst = (ids: readonly string[]) => <T extends { readonly id: string }>(list: readonly T[]): readonly T[] =>
    [...list].sort((a, b) => placeOf(ids, a.id) - placeOf(ids, b.id));
  const usual = situations.first()?.situation.pairs ?? [];
  const punchIds = [...named.map(({ punch }) => punch), ...told, ...usual.map(({ punch }) => punch.id)];
  const dieIds = [...named.map(({ die }) => die), ...told, ...usual.map(({ die }) => die.id)];
  return {
    attempts, situations,
    kinds: new Set([...reasons, ...plan.reasons].map(({ kind }) => kind)),
    faces: [...new Set([...[...reasons, ...plan.reasons].flatMap(({ faces }) => faces), ...plan.reasons.flatMap(({ bends }) => bends), ...strokes.flatMap(({ bends, wouldWork }) => [...bends, ...wouldWork.flatMap(({ before }) => before)])])],
    punches: nearFirst(punchIds)(tools.flatMap((tool) => (tool.kind === "punch" && tool.tang === machine.punchTang && tool.pieces.length > 0 ? [tool] : []))),
    dies: nearFirst(dieIds)(tools.flatMap((tool) => (tool.kind === "die" && tool.tang === machine.dieTang && tool.pieces.length > 0 && tool.flattening === undefined ? [tool] : []))
      .sort((a, b) => Math.abs(Math.log(a.vOpening / situations.wantedV)) - Math.abs(Math.log(b.vOpening / situations.wantedV)))),
  };
}

const placeOf = (ids: readonly string[], id: string) => (ids.includes(id) ? ids.indexOf(id) : ids.length);
