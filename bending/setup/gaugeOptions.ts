import { hitSides } from "../clearance/hitSides";
import { machineFrames, type Hit } from "../clearance/machineFrames";
import { rad } from "../core/units";
import { MEANT_CONTACT_MM } from "../core/tolerance";
import { convexOverlap } from "../geometry/convexOverlap";
import { convexPieces } from "../geometry/convexPieces";
import { freeIntervals } from "../geometry/freeIntervals";
import type { Frame } from "../geometry/frame";
import type { Interval } from "../geometry/interval";
import { mergeIntervals } from "../geometry/mergeIntervals";
import type { Vec2 } from "../geometry/vec2";
import type { PartModel } from "../part/partModel";
import type { BackGauge, Machine } from "../tooling/machine";
import type { Die, Punch } from "../tooling/tool";
import { edgeContacts, type Contact } from "./edgeContacts";
import { fingerHeight } from "./fingerHeight";
import { foldContact } from "./foldContact";
import type { GaugeOption } from "./gaugeOption";
import { plateInProfile } from "./plateInProfile";
import { uprightContact } from "./uprightContact";
import { zonesInMachine, type ZonePiece } from "./zonesInMachine";

/**
 * Every way to locate the sheet before a stroke, best first: two fingers before one, a straight edge or an
 * upright flange before a slanted edge, the nearest to the bend line first (least error adds up).
 * Before the stroke the sheet lies level on the die.
 */
export function gaugeOptions(part: PartModel, hit: Hit, machine: Machine, punch: Punch, die: Die): readonly GaugeOption[] {
  const frames = machineFrames(part, hit, rad(0), punch, die);
  const front = hitSides(part, hit);
  const { gauge } = machine;
  const contacts: Contact[] = [];
  part.faces.forEach((_, index) => {
    const frame = frames[index];
    if (front[index] || frame === undefined) return;
    contacts.push(...edgeContacts(part, index, frame, gauge.independent && gauge.fingers > 1));
    const upright = uprightContact(part, index, frame, fingerHeight(gauge));
    if (upright) contacts.push(upright);
  });
  part.bends.forEach(({ parent }, index) => {
    const frame = frames[parent];
    const fold = front[parent] || frame === undefined || !((hit.formed >> index) & 1) ? null : foldContact(part, index, frame);
    if (fold) contacts.push(fold);
  });
  const fingers = convexPieces(gauge.fingerProfile);
  const obstacles: Obstacles = {
    plates: part.faces.map((face, i) => ({ pieces: convexPieces(face.outline, face.holes), frame: frames[i] })),
    zones: zonesInMachine(part, hit, frames),
    thickness: part.thickness,
  };
  const touching = contacts.map((contact) => ({ ...contact, x: contact.x + (Math.abs(contact.slope) * gauge.fingerWidth) / 2 }));
  return joined(touching.filter((contact) => inTravel(contact, gauge)))
    .map((contact) => ({ ...contact, free: clearOf(contact, gauge, fingers, obstacles) }))
    .filter((option) => option.free.length > 0)
    .sort((a, b) => rank(a, gauge) - rank(b, gauge) || nearest(a) - nearest(b) || a.face - b.face || a.edge - b.edge);
}

const rank = (option: GaugeOption, gauge: BackGauge) => {
  const [first, last] = [option.free[0], option.free[option.free.length - 1]];
  const two = gauge.fingers > 1 && first && last && last[1] - first[0] >= gauge.minSpread;
  return (two ? 0 : 2) + (option.slope === 0 ? 0 : 1);
};

const nearest = (option: GaugeOption) => Math.min(...option.free.map(([z]) => option.x + option.slope * z));

/** X travel holds for every finger: at both ends of a slanted edge. */
function inTravel(contact: Contact, { x, r }: BackGauge): boolean {
  const ends = contact.z.map((z) => contact.x + contact.slope * z);
  return ends.every((at) => at >= x[0] && at <= x[1]) && contact.r >= r[0] - MEANT_CONTACT_MM && contact.r <= r[1] + MEANT_CONTACT_MM;
}

/** Contacts at one depth and height are one choice: fingers may stand at different edges then. */
function joined(contacts: readonly Contact[]): readonly (Contact & { readonly spans: readonly Interval[] })[] {
  const groups = new Map<string, (Contact & { spans: Interval[] })>();
  for (const contact of contacts) {
    const key = contact.slope === 0 ? `${contact.on}/${contact.x.toFixed(2)}/${contact.r.toFixed(2)}` : `${contact.face}/${contact.edge}`;
    const known = groups.get(key);
    if (known === undefined) { groups.set(key, { ...contact, spans: [contact.z] }); continue; }
    const longer = contact.z[1] - contact.z[0] > known.z[1] - known.z[0] + 1e-6 ? contact : known;
    groups.set(key, { ...longer, spans: [...known.spans, contact.z] });
  }
  return [...groups.values()];
}

interface Obstacles {
  readonly plates: readonly { readonly pieces: readonly (readonly Vec2[])[]; readonly frame: Frame | undefined }[];
  readonly zones: readonly ZonePiece[];
  readonly thickness: number;
}

/**
 * Where the middle of a finger may stand on the contact: on it by its whole width where that leaves room for
 * two, by half its width at the least; and nothing of the part within the finger.
 */
function clearOf(contact: Contact & { readonly spans: readonly Interval[] }, gauge: BackGauge, fingers: readonly (readonly Vec2[])[], obstacles: Obstacles): readonly Interval[] {
  const half = gauge.fingerWidth / 2;
  const blocked: Interval[] = [];
  const ends = contact.slope === 0 ? [0] : [contact.z[0], (contact.z[0] + contact.z[1]) / 2, contact.z[1]];
  for (const z of ends) {
    const at = contact.x + contact.slope * z;
    for (const met of fingers.flatMap((finger) => meets(finger.map((p): Vec2 => [p[0] + at, p[1] + contact.r]), obstacles))) {
      if (contact.slope === 0) blocked.push([met[0] - half, met[1] + half]);
      else if (Math.max(met[0], z - half) < Math.min(met[1], z + half)) blocked.push([z - half, z + half]);
    }
  }
  const taken = mergeIntervals(blocked);
  return mergeIntervals(contact.spans.map(([from, to]): Interval => {
    const inset = Math.max(0, Math.min(half, (to - from - gauge.minSpread) / 2));
    return [from + inset, to - inset];
  })).flatMap((span) => freeIntervals(span, taken));
}

/** z-extents of what is in a piece of a finger. */
function meets(finger: readonly Vec2[], { plates, zones, thickness }: Obstacles): readonly Interval[] {
  const met: Interval[] = zones.filter(({ outline }) => convexOverlap(finger, outline) > MEANT_CONTACT_MM).map(({ z }) => z);
  for (const { pieces, frame } of plates) {
    if (frame === undefined) continue;
    for (const piece of pieces) {
      const extent = plateInProfile(piece, thickness, frame, finger, MEANT_CONTACT_MM);
      if (extent) met.push(extent);
    }
  }
  return met;
}
