import { deg, mm } from "../core/units";
import { LOAD_CONSTANT_KG, liftingLimit } from "../handbook/liftingLimit";
import type { FindingsContext } from "./context";
import type { Finding } from "./finding";

/** A blank that one person should not lift: over the NIOSH limit under the best conditions, close to the body at knuckle height, held well, now and then. */
export function heavyBlank({ flat }: FindingsContext): readonly Finding[] {
  const { limit } = liftingLimit({ horizontal: mm(250), height: mm(750), travel: mm(250), asymmetry: deg(0) });
  if (flat.massKg <= limit) return [];
  return [{
    key: "mass",
    rule: "mass",
    severity: "caution",
    title: "Too heavy for one person",
    message: `The blank weighs ${flat.massKg.toFixed(1)} kg; above ${limit.toFixed(0)} kg plan for two people or a support, and sooner when it is held far from the body.`,
    source: `NIOSH lifting equation under its best conditions (load constant ${LOAD_CONSTANT_KG} kg); local rules decide`,
    faces: [],
    bends: [],
    paths: [],
    marks: [{ kind: "region", outline: flat.outline }],
    measure: { value: flat.massKg, wanted: limit, unit: "kg" },
    cure: null,
  }];
}
