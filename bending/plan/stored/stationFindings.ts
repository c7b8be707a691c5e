import { formatLength } from "../../core/formatLength";
import { WRITTEN_PLACE_MM } from "../../core/tolerance";
import { mm } from "../../core/units";
import type { PlanReason, PlanStation } from "../planDocument";
import type { ShopNow } from "../storedPlan";
import { storedReason, type StoredContext } from "./storedContext";

/** Whether the plan's stations can be set up today: tools and pieces there, as long as planned, fitting the machine, on the bed, none in another. */
export function stationFindings(context: StoredContext, now: ShopNow): readonly PlanReason[] {
  const { plan } = context;
  const used = new Set<string>();
  return [
    ...plan.stations.flatMap((station) => [...toolsOf(context, station, now), ...piecesOf(context, station, now, used), ...placeOf(context, station)]),
    ...overlaps(context),
  ];
}

function toolsOf({ machine }: StoredContext, station: PlanStation, now: ShopNow): readonly PlanReason[] {
  return ([["punch", station.punch, machine.punchTang], ["die", station.die, machine.dieTang]] as const).flatMap(([kind, id, tang]) => {
    const tool = now.tools.find((entry) => entry.id === id && entry.kind === kind);
    if (tool === undefined) return [storedReason(kind === "punch" ? "no-punch" : "no-die", `station ${station.id}: no piece of the ${kind} ${id} is in service`, { tools: [id] })];
    return tool.tang === tang ? [] : [storedReason(kind === "punch" ? "no-punch" : "no-die", `station ${station.id}: ${machine.name} takes the tang "${tang}", ${id} has "${tool.tang}"`, { tools: [id] })];
  });
}

function piecesOf({ per, units }: StoredContext, station: PlanStation, now: ShopNow, used: Set<string>): readonly PlanReason[] {
  return ([[station.punch, station.punchSections], [station.die, station.dieSections]] as const).flatMap(([id, sections]) => sections.flatMap((section): readonly PlanReason[] => {
    if (section.length === undefined || section.piece === undefined) return [];
    const { piece, length } = section;
    const say = (message: string): readonly PlanReason[] => [storedReason("sections", `station ${station.id}: ${message}`, { tools: [id] })];
    if (used.has(piece)) return say(`the piece ${piece} is needed twice`);
    used.add(piece);
    const gone = now.missing.find((entry) => entry.piece === piece);
    if (gone) return say(`the piece ${piece} of ${id} cannot be used: ${gone.why}`);
    const there = now.tools.find((tool) => tool.id === id)?.pieces.find((entry) => entry.id === piece);
    if (!there) return say(`the piece ${piece} of ${id} is not in service`);
    const planned = mm(length * per);
    if (Math.abs(there.length - planned) > WRITTEN_PLACE_MM) return say(`the piece ${piece} of ${id} is ${formatLength(there.length, units)} long now, ${formatLength(planned, units)} was planned`);
    return (there.horn ?? undefined) === section.horn ? [] : say(`the piece ${piece} of ${id} has another horn than planned`);
  }));
}

function placeOf({ machine, per, units }: StoredContext, { id, from, to }: PlanStation): readonly PlanReason[] {
  const off = Math.max(-machine.bedLength / 2 - from * per, to * per - machine.bedLength / 2);
  return off <= WRITTEN_PLACE_MM ? [] : [storedReason("bed", `station ${id} stands ${formatLength(mm(off), units)} beyond the end of the bed`)];
}

function overlaps({ plan, per, units }: StoredContext): readonly PlanReason[] {
  const sorted = [...plan.stations].sort((a, b) => a.from - b.from);
  return sorted.slice(1).flatMap((station, index) => {
    const before = sorted[index];
    const by = ((before?.to ?? -Infinity) - station.from) * per;
    return by <= WRITTEN_PLACE_MM ? [] : [storedReason("bed", `the stations ${before?.id ?? ""} and ${station.id} stand in each other by ${formatLength(mm(by), units)}`)];
  });
}
