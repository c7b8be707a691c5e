import type { Body } from "./bodies";
import { ZONE_CHORD_MM } from "./limits";
import { MEANT_CONTACT_MM } from "@/bending";
import type { Answers, Scene } from "./scene";
import { selfContact } from "./selfContact";
import type { Stage } from "./stage";
import type { Finding, Outcome } from "./tally";
import { zoneMeets } from "./zoneContact";

const ZONE_MOMENTS = 8;

/** Separating axes of plates see at least 1 / sqrt(3) of the way between two corners. */
const AXES_SEE = Math.sqrt(3);

/** The part against itself. */
export function judgeSelf(scene: Scene, stage: Stage, answers: Answers): { readonly outcome: Outcome; readonly finding: Finding | null } {
  const { halves, motion } = stage;
  const said = answers.blocked.filter(({ kind }) => kind === "self");
  const finding = (outcome: Finding["outcome"], say: string, angle: number | null): Finding => ({ question: "self", outcome, say, angle });
  if (said.length === 0) {
    const { contact, nearest } = selfContact(halves, motion, 0);
    if (contact) return { outcome: "falseFeasible", finding: finding("falseFeasible", `${contact.front.name} met by ${contact.back.name}`, motion.angles[contact.moment] ?? 0) };
    const zone = zoneMet(scene, stage);
    if (zone) return { outcome: "falseFeasible", finding: finding("falseFeasible", `${zone.body.name} met by the zone in the making`, zone.angle) };
    return { outcome: nearest < 2 * scene.machine.settings.clearance ? "near" : "clear", finding: null };
  }
  if (selfContact(halves, motion, 0).contact) return { outcome: "met", finding: null };
  const near = AXES_SEE * scene.machine.settings.clearance + MEANT_CONTACT_MM + ZONE_CHORD_MM;
  const named = said.some(({ face, otherFace }) => {
    const only = (half: readonly Body[]) => half.filter((body) => belongs(scene, body, face) || belongs(scene, body, otherFace));
    return selfContact({ front: only(halves.front), back: only(halves.back) }, motion, near).contact !== null;
  });
  return named ? { outcome: "margin", finding: null } : { outcome: "falseInfeasible", finding: finding("falseInfeasible", "the faces that are named keep apart", null) };
}

const belongs = ({ part }: Scene, body: Body, face: number | null): boolean => {
  const bend = part.bends[body.bend ?? -1];
  return face !== null && (body.face === face || bend?.parent === face || bend?.child === face);
};

/**
 * A shaved body that the zone in the making runs into; the wings that hang on it and what is level with them are left out, and what
 * stands in the zone before the stroke: an earlier stroke brought it there and was judged.
 */
function zoneMet({ part, hit }: Scene, { halves, motion, restAt, zoneAt }: Stage): { readonly body: Body; readonly angle: number } | null {
  const wings = hit.bends.flatMap((i) => [part.bends[i]?.parent, part.bends[i]?.child]);
  const meetsAt = (moment: number, body: Body) => zoneMeets(zoneAt(moment), [body.hull]) && zoneMeets(zoneAt(moment), body.core());
  const before = restAt(0).bodies;
  const others = [...halves.front, ...halves.back].map((body, i) => !body.level && !wings.includes(body.face ?? -1) && !(before[i] && meetsAt(0, before[i])));
  for (let k = 1; k <= ZONE_MOMENTS; k++) {
    const moment = Math.round((motion.own * k) / ZONE_MOMENTS);
    const met = restAt(moment).bodies.find((body, i) => others[i] && meetsAt(moment, body));
    if (met) return { body: met, angle: motion.angles[moment] ?? 0 };
  }
  return null;
}
