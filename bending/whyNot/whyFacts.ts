import type { ReasonKind } from "../plan/planDocument";
import type { Die, Punch } from "../tooling/tool";
import type { Attempts } from "./createAttempts";
import type { WhySituations } from "./situationsOf";

/** What a search for changes knows when it begins. */
export interface WhyFacts {
  readonly attempts: Attempts;
  readonly situations: WhySituations;
  /** Kinds of reason at the end of the order: only changes that bear on one of them are tried. */
  readonly kinds: ReadonlySet<ReasonKind>;
  /** Ids of faces that take part in what is met, or whose level sheet is too short. */
  readonly faces: readonly string[];
  /** Owned tools of the right tang, those that come nearest first. */
  readonly punches: readonly Punch[];
  readonly dies: readonly Die[];
}
