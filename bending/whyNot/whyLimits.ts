import type { PlanProgress } from "../plan/planRequest";

/** How far the search for reasons and changes may go; the request's own `shouldStop` and `onProgress` are not asked. */
export interface WhyLimits {
  /** Asked often; once true, what is found so far is given. */
  readonly shouldStop?: () => boolean;
  readonly onProgress?: (progress: PlanProgress) => void;
  /** Most plans that may be made; a few hundred unless said. */
  readonly plans?: number;
}
