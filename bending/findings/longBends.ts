import { bendLength } from "./bendLength";
import { bendLines } from "./bendLines";
import type { FindingsContext } from "./context";
import type { Finding } from "./finding";
import { lengthCure } from "./lengthCure";
import { named } from "./named";
import { shownLength } from "./shownLength";

/** Bends that are longer than every bed of the shop, the ends that may stand over counted in. */
export function longBends({ part, shop, units, fields }: FindingsContext): readonly Finding[] {
  if (!shop || shop.machines.length === 0) return [];
  const most = Math.max(...shop.machines.map(({ bedLength, maxUncoveredEnd }) => bedLength + 2 * maxUncoveredEnd));
  const long = part.bends.filter((bend) => bendLength(bend) > most + 1e-6);
  if (long.length === 0) return [];
  const longest = Math.max(...long.map(bendLength));
  const ids = long.map(({ id }) => id);
  const bed = Math.max(...shop.machines.map(({ bedLength }) => bedLength as number));
  const path = fields.inMm.profile ? "profile.width" : null;
  return [{
    key: "bed",
    rule: "bed",
    severity: "stop",
    title: "Longer than every bed",
    message: `${named("Bend", ids)} ${ids.length > 1 ? "are up to" : "is"} ${shownLength(longest, units)} long; the longest bed is ${shownLength(bed, units)}, and with its ends standing over it makes ${shownLength(most, units)}.`,
    source: "the shop’s beds",
    faces: [],
    bends: ids,
    paths: path ? [path] : [],
    marks: bendLines(long),
    measure: { value: longest, wanted: most, unit: "mm" },
    cure: path ? lengthCure(path, most, "down", units) : null,
  }];
}
