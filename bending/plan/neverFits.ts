import type { PlanReason } from "./planDocument";
import type { Situation } from "./situation";

/** The nearest tool's problem, when no pair fits a bend; a die of another V than the flat's only when there is none of that one. */
export function neverFits({ part, fits }: Situation, bend: number): readonly PlanReason[] {
  const problems = (fits[bend] ?? []).flatMap((fit) => (fit.ok ? [] : [fit.problem]));
  if (problems.length === 0 || problems.length < (fits[bend] ?? []).length) return [];
  const rightV = problems.filter(({ kind }) => kind !== "radius");
  const nearest = [...(rightV.length > 0 ? rightV : problems)].sort((a, b) => a.off - b.off)[0];
  return nearest === undefined ? [] : [{ kind: nearest.kind, bends: [part.bends[bend]?.id ?? ""], faces: [], tools: nearest.tools, message: nearest.message }];
}
