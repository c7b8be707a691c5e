import { deg, rad, toDeg, toRad } from "../core/units";
import { springback } from "../handbook/springback";
import type { Bend } from "../part/partModel";
import { bendLines } from "./bendLines";
import type { FindingsContext } from "./context";
import type { Finding } from "./finding";
import { lengthCure } from "./lengthCure";
import { shownLength } from "./shownLength";

const SOURCE = "the tools’ own angles; springback after Gardiner (1957)";

/** Bends that no pair of the shop's tools closes far enough, and bends rounder tips cannot make. */
export function sharpAngles(context: FindingsContext): readonly Finding[] {
  const { part, shop, toolsOf, demandedOf, fields, units } = context;
  if (!shop || shop.punches.length === 0) return [];
  return part.bends.flatMap((bend): readonly Finding[] => {
    if (bend.hem !== null) return [];
    const { suiting, sharpEnough } = toolsOf(bend);
    if (suiting.length === 0) return [];
    const own = fields.ofBend.get(bend.id);
    if (sharpEnough.length === 0) {
      const sharpest = Math.max(Math.min(...suiting.map(({ vAngle }) => vAngle as number)), Math.min(...shop.punches.map(({ tipAngle }) => tipAngle as number)));
      const most = widestAngle(context, bend, 180 - sharpest);
      const demanded = demandedOf(bend);
      return [{
        key: `angle ${bend.id}`,
        rule: "angle",
        severity: "stop",
        title: "Sharper than the tools",
        message: `Bend ${bend.id} turns ${round(toDeg(bend.angle))}°, so with its springback it is taken to ${round(Math.max(0, 180 - demanded))}° included; the sharpest pair of the shop whose V suits the sheet goes to ${round(sharpest)}°, which makes ${round(most)}° at most.`,
        source: SOURCE,
        faces: [],
        bends: [bend.id],
        paths: own ? [`${own.path}.angle`] : [],
        marks: bendLines([bend]),
        measure: { value: toDeg(bend.angle), wanted: most, unit: "deg" },
        cure: own && most > 0 ? { path: `${own.path}.angle`, value: most, says: `${round(most)}°` } : null,
      }];
    }
    const finest = Math.min(...shop.punches.map(({ tipRadius }) => tipRadius as number));
    if (finest <= bend.insideRadius + TIP_MM) return [];
    const path = own?.radiusPath ?? "insideRadius";
    return [{
      key: `tip-radius ${bend.id}`,
      rule: "tip-radius",
      severity: "stop",
      title: "Tighter than every punch tip",
      message: `Bend ${bend.id} has an inside radius of ${shownLength(bend.insideRadius, units)}; the finest punch tip of the shop has ${shownLength(finest, units)}.`,
      source: "the punches’ own tips",
      faces: [],
      bends: [bend.id],
      paths: [path],
      marks: bendLines([bend]),
      measure: { value: bend.insideRadius, wanted: finest, unit: "mm" },
      cure: lengthCure(path, finest, "up", units),
    }];
  });
}

/** mm. A tip this much rounder than the bend presses no mark. */
const TIP_MM = 0.05;

const round = (value: number) => String(Math.round(value * 10) / 10);

/** The largest angle, to a tenth of a degree, whose springback stays within `turned` degrees. */
function widestAngle({ part }: FindingsContext, bend: Bend, turned: number): number {
  // Springback takes the same share of every angle at one radius.
  const share = toDeg(springback(rad(toRad(deg(1))), bend.insideRadius, part.thickness, part.material).angle);
  return Math.max(0, Math.floor((turned / share) * 10 + 1e-6) / 10);
}
