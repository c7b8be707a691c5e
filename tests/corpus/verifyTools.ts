import { mmPer } from "@/bending/core/units";
import { airBendForce } from "@/bending/handbook/airBendForce";
import type { PartModel } from "@/bending/part/partModel";
import type { PlanDocument, PlanSection, PlanStation, PlanStep } from "@/bending/plan/planDocument";
import type { PlanRequest } from "@/bending/plan/planRequest";
import { fingerMeetsTools } from "@/bending/setup/fingerMeetsTools";
import type { Die, Punch } from "@/bending/tooling/tool";

interface Tools { readonly punch: Punch | undefined; readonly die: Die | undefined }

const toolsOf = (request: PlanRequest, { punch, die }: { readonly punch: string; readonly die: string }): Tools => ({
  punch: request.tools.find((tool): tool is Punch => tool.kind === "punch" && tool.id === punch),
  die: request.tools.find((tool): tool is Die => tool.kind === "die" && tool.id === die),
});

/**
 * What stands on the bed: the machine takes the tools, pieces are as long as the ones in service, stations do not stand in one another, one ram closes
 * them all; and of every step: its station's tools, force within what tools and machine bear, fingers clear of every station beside them.
 */
export function verifyTools(plan: PlanDocument, request: PlanRequest, part: PartModel): readonly string[] {
  const per = mmPer(plan.units);
  const { machine } = request;
  const wrong = plan.stations.flatMap((station) => stationWrong(station, request, per).map((text) => `station ${station.id}: ${text}`));
  const along = [...plan.stations].sort((a, b) => a.from - b.from);
  along.slice(1).forEach((right, i) => {
    const left = along[i];
    if (left && left.to > right.from + 1e-6) wrong.push(`stations ${left.id} and ${right.id} stand in one another`);
  });
  for (const step of plan.steps) {
    const name = step.bends.join("+");
    const station = plan.stations.find(({ id }) => id === step.station);
    if (station?.punch !== step.punch || station.die !== step.die) wrong.push(`${name}: its tools are not those of station ${step.station}`);
    wrong.push(...forceWrong(step, request, part).map((text) => `${name}: ${text}`));
    for (const finger of step.gauge.fingers) {
      const half = machine.gauge.fingerWidth / 2 / per;
      for (const one of plan.stations) {
        const { punch, die } = toolsOf(request, one);
        if (!punch || !die || one.from >= finger.z + half || one.to <= finger.z - half) continue;
        if (fingerMeetsTools(finger.x * per, finger.r * per, part.thickness, punch, die, machine)) wrong.push(`${name}: the finger at z ${finger.z} stands in the tools of station ${one.id}`);
      }
    }
  }
  return wrong;
}

function stationWrong(station: PlanStation, request: PlanRequest, per: number): readonly string[] {
  const { punch, die } = toolsOf(request, station);
  if (!punch || !die) return ["no such tools"];
  const wrong: string[] = [];
  const { machine } = request;
  if (punch.tang !== machine.punchTang || die.tang !== machine.dieTang) wrong.push("the machine does not take its tools");
  for (const [tool, sections] of [[punch, station.punchSections], [die, station.dieSections]] as const) {
    for (const section of sections) {
      if (section.length === undefined) continue;
      const piece = tool.pieces.find(({ id }) => id === section.piece);
      if (piece && Math.abs(piece.length - section.length * per) > 1e-4) wrong.push(`${piece.id} is ${piece.length} mm long, not ${section.length * per}`);
      if (piece && (piece.horn ?? undefined) !== section.horn) wrong.push(`the horn of ${piece.id} is another`);
    }
    if (station.from * per + total(sections) * per > station.to * per + 1e-3) wrong.push(`the pieces of ${tool.id} are longer than the station`);
  }
  if (Math.abs(Math.max(total(station.punchSections), total(station.dieSections)) - (station.to - station.from)) * per > 1e-3) wrong.push("it is longer than its pieces");
  return wrong;
}

const total = (sections: readonly PlanSection[]) => sections.reduce((sum, { length, gap }) => sum + (length ?? gap), 0);

function forceWrong(step: PlanStep, request: PlanRequest, part: PartModel): readonly string[] {
  const { punch, die } = toolsOf(request, step);
  if (!punch || !die) return ["no such tools"];
  const bent = part.bends.filter(({ id }) => step.bends.includes(id)).reduce((sum, { line: [a, b] }) => sum + Math.hypot(b[0] - a[0], b[1] - a[1]), 0);
  const perMetre = airBendForce(part.material.tensile[1], part.thickness, die.vOpening) * (request.airForceFactor ?? 1);
  const wrong: string[] = [];
  if (Math.abs(step.forceKN - (perMetre * bent) / 1000) > 1e-3) wrong.push(`it takes ${((perMetre * bent) / 1000).toFixed(3)} kN, the plan says ${step.forceKN}`);
  if (step.forceKN > request.machine.maxForce + 1e-6) wrong.push("the machine does not have that force");
  if (perMetre > Math.min(punch.maxForcePerMetre, die.maxForcePerMetre) + 1e-6) wrong.push("the tools do not bear that force");
  return wrong;
}
