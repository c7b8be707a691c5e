import { fail, ok, type Result } from "../../../core/result";
import type { Vec2 } from "../../../geometry/vec2";
import type { DxfEntity, DxfNote, DxfShape, EntityHead } from "./dxfDrawing";
import { entityFields, type EntityFields } from "./entityFields";
import type { RawEntity } from "./rawEntity";
import { readBendData } from "./readBendData";
import { readPolyline } from "./readPolyline";
import { readSpline } from "./readSpline";
import { readText } from "./readText";

/** Kinds that draw nothing that is cut or bent. */
const WITHOUT_LINES = new Set(["DIMENSION", "HATCH", "SOLID", "TRACE", "LEADER", "MLEADER", "MULTILEADER", "VIEWPORT", "ATTDEF", "ATTRIB", "WIPEOUT", "IMAGE", "TOLERANCE", "ACAD_TABLE", "SEQEND", "VERTEX", "XLINE", "RAY", "OLE2FRAME", "ACAD_PROXY_ENTITY"]);

const TURN = 2 * Math.PI;
const RADIANS = Math.PI / 180;

/** One entity (with its vertices, for an old polyline); null for what draws no lines; a note when it cannot be read. */
export function readEntity(raw: RawEntity, vertices: readonly RawEntity[]): Result<DxfEntity | null, DxfNote> {
  const fields = entityFields(raw);
  const head = readHead(raw, fields);
  const normal = fields.number(230, "the extrusion's z", 1);
  const tilt = Math.hypot(fields.number(210, "the extrusion's x", 0), fields.number(220, "the extrusion's y", 0));
  const mirrored = normal < 0;
  const own = ["ARC", "CIRCLE", "LWPOLYLINE", "POLYLINE", "INSERT", "TEXT"].includes(raw.kind);
  if (WITHOUT_LINES.has(raw.kind)) return ok(null);
  if (tilt > 1e-6 && raw.kind !== "LINE" && raw.kind !== "SPLINE") return fail({ line: raw.line, message: `${raw.kind}: it is drawn in a tilted plane; only what lies in the plane of the drawing is read` });
  const shape = readShape(raw, vertices, fields, mirrored && own, mirrored);
  const problem = fields.problem();
  if (problem) return fail(problem);
  if (typeof shape === "string") return fail({ line: raw.line, message: `${raw.kind}: ${shape}` });
  return ok({ ...head, ...shape });
}

function readHead(raw: RawEntity, fields: EntityFields): EntityHead {
  return {
    line: raw.line,
    handle: fields.text(5)?.trim() ?? null,
    layer: readText(fields.text(8) ?? "0") || "0",
    colour: Math.trunc(fields.number(62, "the colour", 256)),
    lineType: (fields.text(6) ?? "BYLAYER").trim(),
    hidden: fields.number(60, "the visibility", 0) === 1 || fields.number(67, "the space", 0) === 1,
    bend: readBendData(raw),
  };
}

/** The shape, or what is wrong with it. */
function readShape(raw: RawEntity, vertices: readonly RawEntity[], fields: EntityFields, flip: boolean, mirrored: boolean): DxfShape | string {
  const x = (value: number) => (flip ? -value : value);
  const point = (code: number, what: string): Vec2 => [x(fields.number(code, `${what} x`)), fields.number(code + 10, `${what} y`)];
  switch (raw.kind) {
    case "LINE": return { kind: "LINE", from: point(10, "start"), to: point(11, "end") };
    case "POINT": return { kind: "POINT", at: point(10, "place") };
    case "CIRCLE":
    case "ARC": {
      const radius = fields.number(40, "the radius");
      if (radius <= 0) return `the radius must be more than 0, not ${radius}`;
      const whole = raw.kind === "CIRCLE";
      const start = whole ? 0 : fields.number(50, "the start angle") * RADIANS;
      const end = whole ? TURN : fields.number(51, "the end angle") * RADIANS;
      const sweep = whole ? TURN : positiveTurn(end - start);
      return { kind: "CONIC", source: raw.kind, centre: point(10, "centre"), u: [x(radius), 0], v: [0, radius], start, sweep };
    }
    case "ELLIPSE": {
      const [u, ratio] = [[fields.number(11, "the long half axis x"), fields.number(21, "the long half axis y")] as const, fields.number(40, "the ratio of the axes")];
      if (Math.hypot(...u) === 0 || ratio <= 0) return "its axes have no length";
      const [start, end] = [fields.number(41, "the start", 0), fields.number(42, "the end", TURN)];
      const side = mirrored ? -ratio : ratio;
      return { kind: "CONIC", source: "ELLIPSE", centre: point(10, "centre"), u, v: [-u[1] * side, u[0] * side], start, sweep: positiveTurn(end - start) };
    }
    case "LWPOLYLINE":
    case "POLYLINE": return readPolyline(raw, vertices, flip);
    case "SPLINE": return readSpline(fields);
    case "INSERT": {
      const block = readText(fields.text(2) ?? "");
      if (block === "") return "the block's name (group 2) is missing";
      return {
        kind: "INSERT", block, at: point(10, "place"), mirrored: flip,
        scale: [fields.number(41, "the scale along x", 1), fields.number(42, "the scale along y", 1)],
        rotation: fields.number(50, "the rotation", 0) * RADIANS,
        columns: Math.max(1, Math.trunc(fields.number(70, "the columns", 1))), rows: Math.max(1, Math.trunc(fields.number(71, "the rows", 1))),
        spacing: [fields.number(44, "the column spacing", 0), fields.number(45, "the row spacing", 0)],
      };
    }
    case "TEXT":
    case "MTEXT": return { kind: "TEXT", text: readText(raw.tags.filter(({ code }) => code === 1 || code === 3).map(({ value }) => value).join("")), at: point(10, "place") };
    default: return "this kind is not read; draw it as lines, arcs or polylines";
  }
}

/** An angle made more than 0 and at most a full turn. */
function positiveTurn(angle: number): number {
  const rest = angle % TURN;
  return rest > 1e-9 ? rest : rest + TURN;
}
