import type { Punch, Tool } from "@/bending";
import type { Body } from "./bodies";
import { farthestForbidden } from "./limits";
import type { Answers, Scene } from "./scene";
import type { Stage } from "./stage";
import { strokeContact, type Contact } from "./strokeContact";
import type { Finding, Outcome, Question } from "./tally";
import { barsOf, type Thing } from "./toolBars";
import { zoneDistance } from "./zoneContact";

export interface Verdict {
  readonly question: Question;
  readonly outcome: Outcome;
  /** What comes nearest, for the modeller to look at. */
  readonly closest: { readonly thing: Thing; readonly contact: Contact; readonly meets: boolean } | null;
  readonly finding: Finding | null;
}

/** Moments at which the zone in the making is looked at. */
const ZONE_MOMENTS = 12;

/** The nearest that the part comes to a thing in the stroke, both halves; the first contact when there is one. */
function both({ halves, motion }: Stage, thing: Thing, near: number, which: (body: Body) => boolean = () => true) {
  const front = strokeContact(halves.front.filter(which), motion, motion.front, thing, near);
  if (front.contact) return front;
  const back = strokeContact(halves.back.filter(which), motion, motion.back, thing, near);
  if (back.contact) return back;
  return (front.nearest?.distance ?? Infinity) < (back.nearest?.distance ?? Infinity) ? front : back;
}

function zoneNearest(stage: Stage, thing: Thing, shaved: boolean): { readonly distance: number; readonly moment: number } {
  let best = { distance: Infinity, moment: 0 };
  if (stage.line[0] - thing.to > 4 || thing.from - stage.line[1] > 4) return best;
  const last = stage.motion.angles.length - 1;
  const bars = barsOf(thing, shaved);
  for (let k = 0; k <= ZONE_MOMENTS; k++) {
    const moment = Math.round((last * k) / ZONE_MOMENTS);
    const distance = zoneDistance(stage.zoneAt(moment), bars, thing.onRam);
    if (distance < best.distance) best = { distance, moment };
  }
  return best;
}

const closestOf = (thing: Thing, contact: Contact | null, meets: boolean) => (contact ? { thing, contact, meets } : null);

/** One thing in the stroke: does what the product says agree with the solids? */
export function judgeThing(scene: Scene, stage: Stage, question: Question, thing: Thing, free: boolean, maker: boolean, tool: Tool | null): Verdict {
  const margin = scene.machine.settings.clearance;
  const angleAt = (moment: number) => stage.motion.angles[moment] ?? 0;
  const finding = (outcome: Finding["outcome"], say: string, angle: number | null): Finding => ({ question, outcome, say: `${thing.name}: ${say}`, angle });
  if (free) {
    const { contact, nearest } = both(stage, thing, 0);
    const zone = maker ? null : zoneNearest(stage, thing, true);
    if (contact) return { question, outcome: "falseFeasible", closest: closestOf(thing, contact, true), finding: finding("falseFeasible", `met by ${contact.body.name}`, angleAt(contact.moment)) };
    if (zone && zone.distance <= 0) return { question, outcome: "falseFeasible", closest: null, finding: finding("falseFeasible", "met by the zone in the making", angleAt(zone.moment)) };
    const near = Math.min(nearest && !nearest.body.level ? nearest.distance : Infinity, zone?.distance ?? Infinity) < 2 * margin;
    return { question, outcome: near ? "near" : "clear", closest: closestOf(thing, nearest, false), finding: null };
  }
  const meets = both(stage, thing, 0);
  if (meets.contact) return { question, outcome: "met", closest: closestOf(thing, meets.contact, true), finding: null };
  const far = farthestForbidden(margin);
  const level = (body: Body) => body.level && tool !== null;
  if (both(stage, thing, far, (body) => !level(body)).contact) return { question, outcome: "margin", closest: null, finding: null };
  if (tool?.kind === "punch" && both(stage, { ...thing, shape: overTip(thing, tool) }, far, level).contact) return { question, outcome: "margin", closest: null, finding: null };
  if (!maker && zoneNearest(stage, thing, false).distance <= far) return { question, outcome: "margin", closest: null, finding: null };
  return { question, outcome: "falseInfeasible", closest: null, finding: finding("falseInfeasible", "clear of everything in the stroke", null) };
}

/** What is over the flanks of a punch: the wings may not come near that. */
function overTip({ shape }: Thing, punch: Punch): Thing["shape"] {
  let top: number = punch.tipRadius;
  punch.profile.forEach(([x, y], i) => {
    const [u, v] = punch.profile[(i + 1) % punch.profile.length] ?? [x, y];
    const lean = Math.atan2(Math.abs(Math.abs(u) - Math.abs(x)), Math.abs(v - y));
    if (Math.abs(lean - punch.tipAngle / 2) < 0.04 && Math.min(y, v) < Math.abs(u) + Math.abs(x) + 4 * punch.tipRadius) top = Math.max(top, y, v);
  });
  const cut = (profile: Float64Array): Float64Array => {
    const kept: number[] = [];
    for (let i = 0; i < profile.length; i += 2) {
      const [x, y] = [profile[i] as number, profile[i + 1] as number];
      const [u, v] = [profile[(i + 2) % profile.length] as number, profile[(i + 3) % profile.length] as number];
      if (y >= top) kept.push(x, y);
      if (y >= top !== v >= top) kept.push(x + ((u - x) * (top - y)) / (v - y), top);
    }
    return Float64Array.from(kept);
  };
  return { ...shape, whole: shape.whole.map(cut).filter(({ length }) => length >= 6) };
}

/** All things that stand on the brake. */
export function judgeTools(scene: Scene, stage: Stage, answers: Answers): readonly Verdict[] {
  const blocks = (kind: "ram" | "bed") => answers.blocked.some((hit) => hit.kind === kind);
  return [
    ...answers.standing.map(({ tool, role, at, free }) => judgeThing(scene, stage, role, stage.thing(tool, at), free, tool === scene.punch || tool === scene.die, tool)),
    judgeThing(scene, stage, "ram", stage.ram, !blocks("ram"), true, null),
    judgeThing(scene, stage, "bed", stage.bed, !blocks("bed"), true, null),
  ];
}
