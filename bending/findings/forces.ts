import type { Bend } from "../part/partModel";
import { airBendForce } from "../handbook/airBendForce";
import { bendLength } from "./bendLength";
import { bendLines } from "./bendLines";
import type { FindingsContext } from "./context";
import type { Finding } from "./finding";
import { named } from "./named";
import { shownLength } from "./shownLength";

const SOURCE = "air-bending force after Oehler, with the highest strength of the material";

/** Bends that need more than the tools bear, or more than a brake that is long enough for them has, over whichever V of the shop. */
export function forces(context: FindingsContext): readonly Finding[] {
  const { part, shop, toolsOf } = context;
  if (!shop) return [];
  const weakTools: Bend[] = [];
  const weakMachine: { readonly bend: Bend; readonly need: number; readonly have: number }[] = [];
  for (const bend of part.bends) {
    if (bend.hem !== null) continue;
    const { sharpEnough, fitting } = toolsOf(bend);
    if (sharpEnough.length === 0) continue;
    if (fitting.length === 0) {
      weakTools.push(bend);
      continue;
    }
    const length = bendLength(bend);
    const need = (Math.min(...fitting.map(({ force }) => force as number)) * length) / 1000;
    const able = shop.machines.filter(({ bedLength, maxUncoveredEnd }) => length - 2 * maxUncoveredEnd <= bedLength);
    const have = Math.max(...able.map(({ maxForce }) => maxForce as number));
    if (able.length > 0 && need > have + 1e-9) weakMachine.push({ bend, need, have });
  }
  return [
    ...(weakTools[0] ? [toolFinding(context, weakTools)] : []),
    ...weakMachine.map(({ bend, need, have }): Finding => ({
      key: `machine-force ${bend.id}`,
      rule: "machine-force",
      severity: "stop",
      title: "More force than any brake has",
      message: `Bend ${bend.id} is ${shownLength(bendLength(bend), context.units)} long and needs ${need.toFixed(0)} kN over the widest V that suits it; the strongest brake it fits has ${have.toFixed(0)} kN.`,
      source: SOURCE,
      faces: [],
      bends: [bend.id],
      paths: [],
      marks: bendLines([bend]),
      measure: { value: need, wanted: have, unit: "kN" },
      cure: null,
    })),
  ];
}

function toolFinding({ part, toolsOf }: FindingsContext, bends: readonly Bend[]): Finding {
  const [first] = bends;
  const widest = first ? toolsOf(first).sharpEnough.at(-1) : undefined;
  const need = widest ? airBendForce(part.material.tensile[1], part.thickness, widest.vOpening) : 0;
  const ids = bends.map(({ id }) => id);
  return {
    key: "tool-force",
    rule: "tool-force",
    severity: "stop",
    title: "More force than the tools bear",
    message: `Even over the widest V that suits the sheet, ${named("bend", ids)} need${ids.length > 1 ? "" : "s"} ${need.toFixed(0)} kN a metre; no die and punch of the shop that go so sharp are rated for that.`,
    source: SOURCE,
    faces: [],
    bends: ids,
    paths: [],
    marks: bendLines(bends),
    measure: { value: need, wanted: widest?.maxForcePerMetre ?? 0, unit: "kN/m" },
    cure: null,
  };
}
