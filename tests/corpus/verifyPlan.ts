import { createClearance } from "@/bending/clearance/createClearance";
import { machineFrames } from "@/bending/clearance/machineFrames";
import { deg, mmPer, rad, toRad } from "@/bending/core/units";
import { applyFrame } from "@/bending/geometry/applyFrame";
import type { Frame } from "@/bending/geometry/frame";
import type { FlatPoint } from "@/bending/geometry/vec2";
import { buildPart } from "@/bending/part/buildPart";
import type { PlanDocument, PlanSection, PlanStation, PlanStep } from "@/bending/plan/planDocument";
import { plannedBends } from "@/bending/plan/plannedBends";
import type { PlanRequest } from "@/bending/plan/planRequest";
import type { Die, Punch } from "@/bending/tooling/tool";
import { verifySeconds } from "./verifySeconds";
import { verifyTools } from "./verifyTools";

/**
 * Goes through a plan with its own small arithmetic and a fresh clearance: every bend once, nothing in the way that no place helps, pieces real and
 * used once, bends covered, no tool where it must not stand, gauge within its travel and on the part, forces, and the time worked out again.
 * Returns what is wrong.
 */
export function verifyPlan(plan: PlanDocument, request: PlanRequest): readonly string[] {
  const wrong: string[] = [];
  const per = mmPer(plan.units);
  const built = buildPart(request.document, { materials: request.materials, ...plannedBends(plan) });
  if (!built.ok) return ["the part does not build"];
  const part = built.value;
  const demanded = new Map(plan.steps.flatMap((step) => step.bends.map((id) => [id, step.demandedAngle] as const)));
  const clearance = createClearance(part, request.machine, { demandedAngle: (bend) => toRad(deg(demanded.get(part.bends[bend]?.id ?? "") ?? 0)) });
  const tool = <Kind extends "punch" | "die">(kind: Kind, id: string) => request.tools.find((one) => one.kind === kind && one.id === id) as Kind extends "punch" ? Punch : Die;
  const used = new Set<string>();
  for (const station of plan.stations) wrong.push(...piecesWrong(station, request, used));
  let formed = 0;
  for (const step of plan.steps) {
    const name = step.bends.join("+");
    const bends = step.bends.map((id) => part.bends.findIndex((bend) => bend.id === id));
    if (bends.some((bend) => bend < 0 || (formed >> bend) & 1)) wrong.push(`${name}: no such bend, or made twice`);
    const hit = { bends, front: part.faces.findIndex((face) => face.id === step.front), formed };
    const [punch, die] = [tool("punch", step.punch), tool("die", step.die)];
    if (!punch || !die) return [...wrong, `${name}: no such punch or die`];
    wrong.push(...clearance.blocked(hit, punch, die).map((met) => `${name}: blocked (${met.kind})`));
    const middle = ((step.bendZ[0] + step.bendZ[1]) / 2) * per;
    for (const station of plan.stations) {
      for (const kind of ["punch", "die"] as const) {
        const forbidden = clearance.forbidden(hit, punch, die, tool(kind, station[kind]));
        for (const [from, to] of spans(station, kind === "punch" ? station.punchSections : station.dieSections)) {
          const met = forbidden.find(([a, b]) => a + middle < to * per - 1e-3 && b + middle > from * per + 1e-3);
          if (met) wrong.push(`${name}: ${kind} of station ${station.id} stands where it must not (${met.join(" to ")})`);
        }
      }
      if (station.id === step.station) wrong.push(...coverWrong(step, station, request).map((text) => `${name}: ${text}`));
    }
    wrong.push(...gaugeWrong(step, request, per).map((text) => `${name}: ${text}`));
    const frames = machineFrames(part, hit, rad(0), punch, die);
    const faceIndex = part.faces.findIndex((face) => face.id === step.gauge.face);
    const [frame, outline] = [frames[faceIndex], part.faces[faceIndex]?.outline];
    for (const finger of step.gauge.fingers) {
      if (!frame || !outline) { wrong.push(`${name}: the gauge names no face`); continue; }
      const reach = reachAt(frame, outline, part.thickness, step, ((finger.z * per) - middle), request.machine.gauge.fingerWidth);
      if (Math.abs(finger.x * per - reach) > 0.02) wrong.push(`${name}: finger at ${finger.x}, the face ends at ${reach / per}`);
    }
    for (const bend of bends) formed |= 1 << bend;
  }
  if (formed !== 2 ** part.bends.length - 1) wrong.push("not every bend is made");
  return [...wrong, ...verifyTools(plan, request, part), ...verifySeconds(plan, request, part)];
}

/** How far back the face stands where a finger is: its farthest point, or what a slanted edge has across the finger's width. */
function reachAt(frame: Frame, outline: readonly FlatPoint[], thickness: number, { gauge }: PlanStep, z: number, width: number): number {
  const [a, b] = [outline[gauge.edge], outline[(gauge.edge + 1) % outline.length]].map((p) => applyFrame(frame, [p?.[0] ?? 0, p?.[1] ?? 0, 0]));
  const slope = a && b ? (b[0] - a[0]) / (b[2] - a[2]) : 0;
  if (a && gauge.on === "edge" && Math.abs(slope) > 0.0018) return a[0] + slope * (z - a[2]) + (Math.abs(slope) * width) / 2;
  return Math.max(...outline.flatMap((p) => [0, thickness].map((level) => applyFrame(frame, [p[0], p[1], level])[0])));
}

function spans(station: PlanStation, sections: readonly PlanSection[]): readonly (readonly [number, number])[] {
  let at = station.from;
  return sections.flatMap((section) => {
    const from = at;
    at += section.length ?? section.gap;
    return section.length === undefined ? [] : [[from, at] as const];
  });
}

function piecesWrong(station: PlanStation, request: PlanRequest, used: Set<string>): readonly string[] {
  const wrong: string[] = [];
  for (const [id, sections] of [[station.punch, station.punchSections], [station.die, station.dieSections]] as const) {
    const owned = request.tools.find((tool) => tool.id === id)?.pieces ?? [];
    for (const section of sections) {
      if (section.length === undefined) continue;
      const piece = owned.find((one) => one.id === section.piece);
      if (!piece || used.has(piece.id)) wrong.push(`${section.piece ?? "a piece"} of ${id} is not owned or used twice`);
      else used.add(piece.id);
    }
  }
  const { bedLength } = request.machine;
  const per = mmPer(request.document.units);
  if (station.from * per < -bedLength / 2 - 1e-6 || station.to * per > bedLength / 2 + 1e-6) wrong.push(`station ${station.id} is off the bed`);
  return wrong;
}

function coverWrong(step: PlanStep, station: PlanStation, { machine, document }: PlanRequest): readonly string[] {
  const per = mmPer(document.units);
  const { maxUncoveredEnd, maxSectionGap } = machine.settings;
  return [station.punchSections, station.dieSections].flatMap((sections) => {
    const stand = spans(station, sections);
    const [first, last] = [stand[0], stand[stand.length - 1]];
    if (!first || !last) return ["a station without pieces"];
    const ends = Math.max(first[0] - step.bendZ[0], step.bendZ[1] - last[1]) * per;
    const gaps = stand.slice(1).map((span, i) => (span[0] - (stand[i]?.[1] ?? 0)) * per);
    return [...(ends > maxUncoveredEnd + 1e-3 ? [`an end of ${ends} mm is uncovered`] : []), ...(Math.max(0, ...gaps) > maxSectionGap + 1e-3 ? ["a gap between sections is too wide"] : [])];
  });
}

function gaugeWrong(step: PlanStep, { machine: { gauge } }: PlanRequest, per: number): readonly string[] {
  const inside = (value: number, [from, to]: readonly [number, number]) => value * per >= from - 1e-3 && value * per <= to + 1e-3;
  const { fingers } = step.gauge;
  const wrong = fingers.filter(({ x, r, z }) => !inside(x, gauge.x) || !inside(r, gauge.r) || !inside(z, gauge.z)).map(() => "a finger is out of its travel");
  const [a, b] = fingers;
  return a && b && Math.abs(a.z - b.z) * per < gauge.minSpread - 1e-3 ? [...wrong, "the fingers are too near each other"] : wrong;
}
