import { airBendForce } from "../../handbook/airBendForce";
import type { ChangeAmount } from "../../plan/planChange";
import type { PlanDocument } from "../../plan/planDocument";
import type { Tool } from "../../tooling/tool";
import type { WhyFacts } from "../whyFacts";

/** The rating that a tool must have for what a plan does with it, kN/m, rounded up. */
export function ratingNeeded({ attempts: { request }, situations }: WhyFacts, plan: PlanDocument, tools: readonly Tool[], id: string): ChangeAmount {
  const { part } = situations;
  const forces = plan.steps.filter(({ punch, die }) => punch === id || die === id).map(({ die }) => {
    const found = tools.find((tool) => tool.id === die);
    return part && found?.kind === "die" ? airBendForce(part.material.tensile[1], part.thickness, found.vOpening) * (request.airForceFactor ?? 1) : 0;
  });
  return { name: "rating", value: Math.ceil(Math.max(0, ...forces) - 1e-9), unit: "kN/m" };
}
