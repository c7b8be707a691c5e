import { mmPer, type LengthUnit } from "../core/units";
import { selfCrossing } from "../geometry/selfCrossing";
import { signedArea } from "../geometry/signedArea";
import type { ProfilePoint } from "../geometry/vec2";
import { formatLength } from "../core/formatLength";

/** What keeps a cross-section from being one simple polygon, in words with the edges and the place; null when it is one. */
export function profileProblem(profile: readonly ProfilePoint[], units: LengthUnit): string | null {
  const crossing = selfCrossing(profile);
  if (crossing) {
    const [first, second] = crossing.edges;
    const place = `(${formatLength(crossing.at[0], units)}, ${formatLength(crossing.at[1], units)})`;
    return `crosses itself: edge ${first} and edge ${second} meet at ${place}; put the points in order round the outline, each once`;
  }
  const scale = mmPer(units);
  if (Math.abs(signedArea(profile)) < 1e-3 * scale * scale) return "has no area; give the outline of a solid section";
  return null;
}
