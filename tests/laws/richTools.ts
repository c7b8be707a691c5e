import { deg, mm, toRad } from "@/bending/core/units";
import type { Die, Punch, Tool } from "@/bending/tooling/tool";
import { relievedPunchProfile } from "@/bending/tooling/relievedPunchProfile";
import { straightPunchProfile } from "@/bending/tooling/straightPunchProfile";
import { vDieProfile } from "@/bending/tooling/vDieProfile";
import { withLengths } from "./lawRequests";

/** The tools given and as many more of other shapes, so that not every pair of them is looked at first. */
export function richTools(tools: readonly Tool[], lengths: readonly number[]): readonly Tool[] {
  const [punch, die] = [tools.find((tool): tool is Punch => tool.kind === "punch"), tools.find((tool): tool is Die => tool.kind === "die")];
  if (!punch || !die) return tools;
  const tip = { tipAngle: punch.tipAngle, tipRadius: punch.tipRadius, height: punch.height };
  const relieved = (depth: number, height = 80) => relievedPunchProfile({ ...tip, bodyWidth: mm(26), reliefDepth: mm(depth), reliefHeight: mm(height) });
  const punches = ([["narrow", straightPunchProfile({ ...tip, bodyWidth: mm(12) })], ["wide", straightPunchProfile({ ...tip, bodyWidth: mm(30) })], ["relief-4", relieved(4)], ["relief-10", relieved(10, 90)], ["relief-behind", relievedPunchProfile({ ...tip, bodyWidth: mm(26), reliefDepth: mm(18), reliefHeight: mm(90), side: "back" })]] as const)
    .map(([id, profile]): Tool => ({ ...punch, id, profile }));
  const dies = ([[10, 30], [12, 26], [14, 50], [20, 60]] as const).map(([v, width]): Tool => {
    const shape = { vOpening: mm(v), vAngle: toRad(deg(86)), shoulderRadius: mm(v / 8), height: die.height, bodyWidth: mm(width) };
    return { ...die, id: `V${v}/${width}`, vOpening: mm(v), shoulderRadius: mm(v / 8), profile: vDieProfile(shape) };
  });
  return [...tools, ...[...punches, ...dies].map((tool) => withLengths(tool, lengths))];
}
