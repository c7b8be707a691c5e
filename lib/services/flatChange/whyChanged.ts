import type { ShopNow } from "./loadShopNow";
import { formatLength } from "@/bending/core/formatLength";
import { toDeg, type LengthUnit } from "@/bending/core/units";
import type { Bend, PartModel } from "@/bending/part/partModel";
import { angleClass } from "@/bending/shopTable/angleClass";
import type { ShopCell } from "@/bending/shopTable/shopCell";
import type { TrialRow } from "@/db/bendTrials/trialRow";
import type { MaterialRow } from "@/db/materials/materialRow";

/** Thickness of a part that belongs to a nominal one, as in the values themselves. */
const SAME_THICKNESS = 0.02;

/**
 * What changed since a flat was computed, in words: trials that came or went where its bends look, and a new version of the material. The
 * places that its values stand on now come first; when nothing changed there, other places of its thickness and angles.
 */
export function whyChanged(part: PartModel, material: MaterialRow, shop: ShopNow, { since, units }: { readonly since: Date; readonly units: LengthUnit }): readonly string[] {
  const own = shop.table.cells.filter((cell) => cell.material === material.id);
  const reasonsIn = (cells: readonly Pick<ShopCell, "key" | "material" | "thickness" | "vOpening" | "angle">[]) => cells.flatMap((cell) => {
    const changes = trialChanges(shop.trialsOf.get(cell.key) ?? [], since);
    return changes === "" ? [] : [`${cell.material} ${formatLength(cell.thickness, units)}, V ${formatLength(cell.vOpening, units)}, ${cell.angle}°: ${changes}`];
  });
  const used = reasonsIn(own.filter((cell) => part.bends.some((bend) => standsOn(bend, cell))));
  const near = used.length > 0 ? used : reasonsIn(own.filter((cell) => isNear(part, cell)));
  const newer = material.version > 1 && material.changed_at > since;
  const found = [...near, ...(newer ? [`${material.id}: version ${material.version} of ${material.changed_at.toISOString().slice(0, 10)}`] : [])];
  return found.length > 0 ? found : ["trials count again, or were taken back"];
}

const standsOn = ({ allowanceBasis }: Bend, cell: ShopCell): boolean =>
  (allowanceBasis?.shop?.places ?? []).some(({ thickness, vOpening, angle, punchRadii }) =>
    thickness === cell.thickness && vOpening === cell.vOpening && angle === cell.angle && punchRadii.includes(cell.punchRadius));

const isNear = (part: PartModel, cell: ShopCell): boolean =>
  Math.abs(cell.thickness - part.thickness) <= SAME_THICKNESS * part.thickness && part.bends.some((bend) => angleClass(toDeg(bend.angle)) === cell.angle);

function trialChanges(trials: readonly TrialRow[], since: Date): string {
  const after = (moment: Date | null): boolean => moment !== null && moment > since;
  const added = trials.filter((trial) => after(trial.created_at) && trial.excluded_at === null && trial.withdrawn_at === null);
  const left = trials.filter((trial) => after(trial.excluded_at) && !after(trial.created_at) && trial.withdrawn_at === null).length;
  const gone = trials.filter((trial) => after(trial.withdrawn_at) && !after(trial.created_at)).length;
  return [
    ...(added.length === 0 ? [] : [`${added.length} new ${added.length === 1 ? "trial" : "trials"} ${onDays(added)}`]),
    ...(left === 0 ? [] : [`${left} left out`]),
    ...(gone === 0 ? [] : [`${gone} withdrawn`]),
  ].join(", ");
}

function onDays(trials: readonly TrialRow[]): string {
  const days = trials.map((trial) => trial.measured_on).sort();
  const [first, last] = [days[0], days[days.length - 1]];
  return first === last ? `on ${first}` : `from ${first} to ${last}`;
}
