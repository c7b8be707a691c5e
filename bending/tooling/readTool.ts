import type { FieldProblem } from "../core/problem";
import { fail, ok, type Result } from "../core/result";
import { deg, kiloNewtonPerMetre, mm, mmPer, toRad, type LengthUnit } from "../core/units";
import { signedArea } from "../geometry/signedArea";
import type { ProfilePoint } from "../geometry/vec2";
import { dieProblems } from "./dieProblems";
import { piecesOf } from "./piecesOf";
import { profileProblem } from "./profileProblem";
import { punchProblems } from "./punchProblems";
import type { Die, Tool } from "./tool";
import type { DieEntry, ToolEntry } from "./toolingDocument";

/** One tool of a tooling document in millimetres and radians, its profile counter-clockwise. */
export function readTool(entry: ToolEntry, path: string, units: LengthUnit): Result<Tool, readonly FieldProblem[]> {
  const scale = mmPer(units);
  const drawn = entry.profile.map(([x, y]): ProfilePoint => [x * scale, y * scale]);
  const crossing = profileProblem(drawn, units);
  if (crossing) return fail([{ path: `${path}.profile`, message: crossing }]);
  const { pieces, problems } = piecesOf(entry, path, scale);
  const common = {
    id: entry.id,
    name: entry.name ?? entry.id,
    profile: signedArea(drawn) > 0 ? drawn : [...drawn].reverse(),
    height: mm(entry.height * scale),
    maxForcePerMetre: kiloNewtonPerMetre(entry.maxForcePerMetre),
    tang: entry.tang,
    pieces,
  };
  const tool: Tool = entry.kind === "punch"
    ? { ...common, kind: "punch", tipAngle: toRad(deg(entry.tipAngle)), tipRadius: mm(entry.tipRadius * scale) }
    : { ...common, kind: "die", vOpening: mm(entry.vOpening * scale), vAngle: toRad(deg(entry.vAngle)), shoulderRadius: mm(entry.shoulderRadius * scale), ...slot(entry.flattening, scale) };
  const all = [...problems, ...(tool.kind === "punch" ? punchProblems(tool, path, units) : dieProblems(tool, path, units))];
  return all.length ? fail(all) : ok(tool);
}

const slot = (given: DieEntry["flattening"], scale: number): Pick<Die, "flattening"> =>
  given === undefined ? {} : { flattening: { floor: mm(given.floor * scale), back: mm(given.back * scale), opening: mm(given.opening * scale) } };
