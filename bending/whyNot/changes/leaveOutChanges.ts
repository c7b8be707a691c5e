import type { PartDocument } from "../../part/partDocument";
import type { PlanChange } from "../../plan/planChange";
import { offeredChange } from "../offeredChange";
import type { WhyFacts } from "../whyFacts";
import { withoutFlange } from "./withoutFlange";

/** Flanges that are left out one by one, at the most. */
const MOST_FLANGES = 6;

/** The part without one flange (and all that hangs on it), to be made as a part of its own. Only for a plan of the planner's own order. */
export function leaveOutChanges({ attempts, faces }: WhyFacts): readonly PlanChange[] {
  const { request } = attempts;
  if ("order" in request) return [];
  attempts.doing("Looking whether the part can be made without a flange");
  return faces.filter((face) => face !== "base").slice(0, MOST_FLANGES).flatMap((face) => {
    const before = attempts.plans();
    const left: { readonly document: PartDocument; readonly gone: readonly string[] } | null = withoutFlange(request.document, face);
    if (left === null) return [];
    const attempt = attempts.first({ document: left.document });
    if (attempt.kind !== "works") return [];
    const hanging = left.gone.length > 1 ? ` and what hangs on it (${left.gone.slice(1).join(", ")})` : "";
    return [offeredChange(attempts, before, { change: { document: left.document }, plan: attempt.plan }, {
      kind: "leave-out", group: "part", what: { bends: left.gone }, amount: null, with: [],
      message: `Without ${face}${hanging} there is a plan: ${left.gone.length > 1 ? "they" : "it"} could be a part of its own, joined on afterwards.`,
    })];
  });
}
