import type { FindingsContext } from "./context";
import type { Finding } from "./finding";
import { shownLength } from "./shownLength";

/** How far from the usual V still counts as it. The planner's own measure; common practice, no source. */
const WISHED_RATIO = 1.5;

/** Does the shop own a die for this thickness at all, and one near the usual V? */
export function vOpenings({ part, shop, toolsOf, units }: FindingsContext): readonly Finding[] {
  const bent = part.bends.filter(({ hem }) => hem === null);
  const [first] = bent;
  if (!shop || !first) return [];
  const { suiting, usual } = toolsOf(first);
  const near = suiting.some(({ vOpening }) => Math.abs(Math.log(vOpening / usual)) <= Math.log(WISHED_RATIO) + 1e-9);
  if (near) return [];
  const sheet = shownLength(part.thickness, units);
  const common = {
    key: "v-opening", rule: "v-opening", faces: [], bends: bent.map(({ id }) => id), paths: ["thickness"], marks: [], measure: null, cure: null,
  } as const;
  const wish = `the usual V for ${sheet} is ${shownLength(usual, units)}`;
  return [suiting.length === 0
    ? { ...common, severity: "stop", title: "No die for this thickness", source: "air bending needs a V of 5 to 20 thicknesses (Oehler’s force formula holds there); usual V by a trade chart", message: `The shop has no die in service whose V is 5 to 20 times the thickness; ${wish}.` }
    : { ...common, severity: "caution", title: "No die near the usual V", source: "V opening by a trade chart; half as much again either way is common practice", message: `The dies in service that suit ${sheet} have a V of ${suiting.map(({ vOpening }) => shownLength(vOpening, units)).filter((text, i, all) => all.indexOf(text) === i).join(", ")}; ${wish}.` }];
}
