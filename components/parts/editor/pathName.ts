import type { PartDraft } from "../draft/partDraft";

const names: Readonly<Record<string, string>> = {
  name: "Name", number: "Number", note: "Note", material: "Material", thickness: "Thickness", insideRadius: "Inside radius", kFactor: "K-factor", rule: "Bend allowance",
  toleranceAngle: "Angle tolerance", toleranceLength: "Length tolerance", length: "length", angle: "angle", edge: "edge", on: "stands on", start: "inset at start", end: "inset at end",
  startAngle: "side at start", endAngle: "side at end", gap: "gap", hem: "hem", id: "name", relief: "relief", "relief.kind": "relief", "relief.width": "relief width", "relief.depth": "relief depth", corner: "corners", "corner.kind": "corners", "corner.gap": "gap in the corner", grain: "rolling direction", "offset.height": "offset height", strokeWith: "formed in one stroke with", direction: "direction", dimension: "measured", outline: "outline", width: "width", depth: "depth", diameter: "diameter",
};

const inHole: Readonly<Record<string, string>> = {
  circle: "middle", "circle[0]": "x", "circle[1]": "y", "slot[0]": "first end", "slot[1]": "other end", "slot[0][0]": "from x", "slot[0][1]": "from y", "slot[1][0]": "to x", "slot[1][1]": "to y",
  polygon: "corners", "polygon[0][0]": "x", "polygon[0][1]": "y", "polygon.width": "width", "polygon.height": "height",
};

/** `holes[0].circle[1]` is "hole 1, y"; `outline[2]` is "corner 3". */
function ownName(path: string): string {
  const corner = /^outline\[(\d+)\]/.exec(path);
  if (corner !== null) return `corner ${Number(corner[1]) + 1}`;
  const hole = /^holes\[(\d+)\](?:\.(.+))?/.exec(path);
  if (hole === null) return names[path] ?? path;
  return `hole ${Number(hole[1]) + 1}${hole[2] === undefined ? "" : `, ${inHole[hole[2]] ?? names[hole[2]] ?? hole[2]}`}`;
}

/** A path of the document in the words of the form: `flanges[1].length` is "Flange left, length". */
export function pathName(path: string, draft: PartDraft): string {
  const leg = /^profile\.legs\[(\d+)\]/.exec(path);
  if (leg !== null) return `Leg ${Number(leg[1]) + 1}`;
  const bend = /^profile\.bends\[(\d+)\](?:\.(\w+))?/.exec(path);
  if (bend !== null) return `Bend ${Number(bend[1]) + 1}${bend[2] === undefined ? "" : `, ${names[bend[2]] ?? bend[2]}`}`;
  const flange = /^flanges\[(\d+)\](?:\.(.+))?/.exec(path);
  if (flange !== null) return `Flange ${draft.flanges[Number(flange[1])]?.id ?? flange[1] ?? ""}${flange[2] === undefined ? "" : `, ${ownName(flange[2])}`}`;
  const line = /^flat\.bends\[(\d+)\](?:\.(\w+))?/.exec(path);
  if (line !== null) return `Bend ${draft.flat?.bends[Number(line[1])]?.id ?? line[1] ?? ""}${line[2] === undefined ? "" : `, ${names[line[2]] ?? line[2]}`}`;
  if (path.startsWith("flat.")) { const own = ownName(path.slice(5)); return `${own[0]?.toUpperCase() ?? ""}${own.slice(1)}`; }
  if (path === "profile.width") return "Width";
  if (path.startsWith("base.")) return `Base, ${ownName(path.slice(5))}`;
  const name = names[path];
  return name === undefined ? path : `${name[0]?.toUpperCase() ?? ""}${name.slice(1)}`;
}
