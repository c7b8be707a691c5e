import { mergeIntervals } from "../geometry/mergeIntervals";
import type { PartModel } from "../part/partModel";
import { acuteHem } from "../strokes/acuteHem";
import type { Machine } from "../tooling/machine";
import type { Die } from "../tooling/tool";
import type { Clearance } from "./clearance";
import { createClearance, type ClearanceOptions } from "./createClearance";
import { createFlattening } from "./createFlattening";
import type { Hit } from "./hit";

/**
 * Clearance of a part with hems: every stroke on a plain bend is asked of the part as it is, with its finished hems closed; the two strokes
 * of a hem are asked together: bent acutely on the V, then flattened in the slot of the same die.
 */
export function withHems(part: PartModel, machine: Machine, options: ClearanceOptions): Clearance {
  const plain = createClearance(part, machine, options);
  if (part.bends.every(({ hem }) => hem === null)) return plain;
  const flattening = createFlattening(part, machine, options.margin ?? machine.settings.clearance);
  const acute = new Map<string, Clearance>();
  const isHem = (hit: Hit) => part.bends[hit.bends[0] ?? -1]?.hem !== null;
  const acuteOf = (hit: Hit, die: Die): Clearance => {
    const key = `${hit.bends.join()}/${die.vOpening}`;
    const found = acute.get(key) ?? createClearance(hit.bends.reduce((bent, hem) => acuteHem(bent, hem, die.vOpening), part), machine, options);
    acute.set(key, found);
    return found;
  };
  return {
    forbidden: (hit, punch, die, tool) => !isHem(hit) ? plain.forbidden(hit, punch, die, tool)
      : mergeIntervals([...acuteOf(hit, die).forbidden(hit, punch, die, tool), ...flattening.meets(hit, punch, die, tool).map(({ z }) => z)]),
    evidence: (hit, punch, die, tool) => !isHem(hit) ? plain.evidence(hit, punch, die, tool)
      : [...acuteOf(hit, die).evidence(hit, punch, die, tool), ...flattening.meets(hit, punch, die, tool)],
    inStroke: (hit, punch, die, tool) => (isHem(hit) ? [] : plain.inStroke(hit, punch, die, tool)),
    blocked: (hit, punch, die) => !isHem(hit) ? plain.blocked(hit, punch, die)
      : [...acuteOf(hit, die).blocked(hit, punch, die), ...flattening.blocked(hit, punch, die)],
    firstBlock: (hit, punch, die) => {
      if (!isHem(hit)) return plain.firstBlock(hit, punch, die);
      const first = acuteOf(hit, die).firstBlock(hit, punch, die);
      return first.length > 0 ? first : flattening.blocked(hit, punch, die);
    },
    counts: () => [plain, ...acute.values()].map((one) => one.counts()).reduce((sum, one) => ({ clips: sum.clips + one.clips, entries: sum.entries + one.entries })),
  };
}
