import { machineFrames } from "@/bending/clearance/machineFrames";
import { mmPer, rad } from "@/bending/core/units";
import { applyFrame } from "@/bending/geometry/applyFrame";
import type { PartModel } from "@/bending/part/partModel";
import type { PlanDocument, PlanStep } from "@/bending/plan/planDocument";
import type { PlanRequest } from "@/bending/plan/planRequest";
import type { Die, Punch } from "@/bending/tooling/tool";
import { handlingByHand, handlingTime, type Lying } from "./handlingByHand";

/** Seconds. Numbers of a plan are rounded in the sixth place; a batch of thousands multiplies that. */
const same = (a: number, b: number, batch = 1) => Math.abs(a - b) <= 1e-5 * Math.max(1, batch);
/** mm. Gauge settings nearer than the first are surely one, further apart than the second surely two. */
const [ONE_SETTING, TWO_SETTINGS] = [1e-4, 0.0101];

interface Setting { readonly x: number; readonly slope: number; readonly r: number }

/**
 * Works the time out again from the written steps alone: side up and heading from the front face and the bend's zone in the flat, walks
 * from where the stations stand, gauge moves from where the fingers stand, setup from the pieces. Returns what is wrong.
 */
export function verifySeconds(plan: PlanDocument, request: PlanRequest, part: PartModel): readonly string[] {
  const { times } = request.machine;
  const wrong: string[] = [];
  const pieces = plan.stations.flatMap((one) => [...one.punchSections, ...one.dieSections]).filter((section) => section.length !== undefined).length;
  const setup = plan.stations.length * times.stationSetup + pieces * times.sectionPlace;
  if (!same(plan.seconds.setup, setup)) wrong.push(`the setup takes ${setup} s, the plan says ${plan.seconds.setup}`);
  let [least, most, formed] = [0, 0, 0];
  let before: (Lying & { readonly step: PlanStep; readonly setting: Setting | null }) | null = null;
  for (const step of plan.steps) {
    const pose = poseOf(part, step);
    const setting = settingOf(plan, request, part, step, formed);
    const changed = before === null ? [1, 1] : settingChanges(before.setting, setting);
    let seconds = times.stroke;
    if (before !== null) {
      const { flip, turn } = handlingByHand(before, pose);
      if (flip !== step.handling.flip || Math.abs(turn - step.handling.turn) > 0.15) {
        wrong.push(`${step.bends.join("+")}: handled with flip ${flip} and a turn of ${turn.toFixed(1)}, the plan says ${step.handling.flip} and ${step.handling.turn}`);
      }
      seconds += handlingTime({ flip, turn }, times) + walked(plan, before.step, step) / 1000 * times.walkPerMetre;
    } else if (step.handling.flip || step.handling.turn !== 0) wrong.push("the first step handles nothing");
    least += seconds + (changed[0] ?? 0) * times.gaugeMove;
    most += seconds + (changed[1] ?? 0) * times.gaugeMove;
    before = { step, ...pose, setting };
    for (const id of step.bends) formed |= 1 << part.bends.findIndex((bend) => bend.id === id);
  }
  const { perPart, total } = plan.seconds;
  if (perPart < least - 1e-4 || perPart > most + 1e-4) wrong.push(`a part takes ${least === most ? least : `${least} to ${most}`} s, the plan says ${perPart}`);
  if (!same(total, plan.seconds.setup + plan.batch * perPart, plan.batch)) wrong.push(`setup and batch make ${plan.seconds.setup + plan.batch * perPart} s, the plan says ${total}`);
  if (!same(plan.cost, total, plan.batch)) wrong.push(`the cost is ${plan.cost}, the time ${total}`);
  return wrong;
}

/** Which side is up, and which direction of the flat points away from the operator, degrees. */
function poseOf(part: PartModel, step: PlanStep): Lying {
  const bend = part.bends.find(({ id }) => id === step.bends[0]);
  if (!bend) return { up: 0, heading: 0 };
  const [parentStart, childStart, childEnd, parentEnd] = bend.zone;
  const sign = part.faces[bend.parent]?.id === step.front ? 1 : -1;
  const [x, y] = [childStart[0] + childEnd[0] - parentStart[0] - parentEnd[0], childStart[1] + childEnd[1] - parentStart[1] - parentEnd[1]];
  return { up: bend.direction === "up" ? 1 : -1, heading: (Math.atan2(sign * y, sign * x) * 180) / Math.PI };
}

/** mm between the middles of the stations of two steps. */
function walked(plan: PlanDocument, from: PlanStep, to: PlanStep): number {
  const middle = (step: PlanStep) => {
    const station = plan.stations.find(({ id }) => id === step.station);
    return station ? ((station.from + station.to) / 2) * mmPer(plan.units) : NaN;
  };
  return from.station === to.station ? 0 : Math.abs(middle(from) - middle(to));
}

/** Where the gauge is set, mm, as seen from the middle of the stroke; null when nothing is touched. */
function settingOf(plan: PlanDocument, request: PlanRequest, part: PartModel, step: PlanStep, formed: number): Setting | null {
  const per = mmPer(plan.units);
  const finger = step.gauge.fingers[0];
  if (!finger) return null;
  const middle = (step.bendZ[0] + step.bendZ[1]) / 2;
  const tool = (id: string) => request.tools.find((one) => one.id === id);
  const bends = step.bends.map((id) => part.bends.findIndex((bend) => bend.id === id));
  const hit = { bends, front: part.faces.findIndex(({ id }) => id === step.front), formed };
  const face = part.faces.findIndex(({ id }) => id === step.gauge.face);
  const frame = machineFrames(part, hit, rad(0), tool(step.punch) as Punch, tool(step.die) as Die)[face];
  const outline = part.faces[face]?.outline ?? [];
  const [p, q] = [outline[step.gauge.edge], outline[(step.gauge.edge + 1) % outline.length]];
  if (!frame || !p || !q) return null;
  const [a, b] = [applyFrame(frame, [p[0], p[1], 0]), applyFrame(frame, [q[0], q[1], 0])];
  const exact = step.gauge.on === "edge" ? (b[0] - a[0]) / (b[2] - a[2]) : 0;
  const slope = Math.abs(exact) < 0.0018 ? 0 : exact;
  return { x: (finger.x - slope * (finger.z - middle)) * per, slope, r: finger.r * per };
}

/** How many gauge moves there are between two settings: at the least and at the most, where rounding leaves it open. */
function settingChanges(from: Setting | null, to: Setting | null): readonly [number, number] {
  if (from === null || to === null) return from === to ? [0, 0] : [1, 1];
  const off = Math.max(Math.abs(from.x - to.x), Math.abs(from.r - to.r), 100 * Math.abs(from.slope - to.slope));
  return off < ONE_SETTING ? [0, 0] : off > TWO_SETTINGS ? [1, 1] : [0, 1];
}
