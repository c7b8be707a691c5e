import type { gp_Dir, gp_Pnt, TopoDS_Face, TopoDS_Shape } from "replicad-opencascadejs";
import type { Loop, LoopEdge, Solid, SolidEdge, SolidFace, Surface } from "@/bending/exchange/step/solid";
import type { Vec3 } from "@/bending/geometry/vec3";
import { createNumbering } from "./createNumbering";
import type { Kernel } from "./kernel";
import { shapesIn } from "./shapesIn";

/** Chords of curves that are neither lines nor circles stand no farther off than this (mm), and turn no more than this (radians). */
const CURVE_CHORD_MM = 0.005;
const CURVE_TURN = 0.1;

const point = (p: gp_Pnt): Vec3 => [p.X(), p.Y(), p.Z()];
const direction = (d: gp_Dir): Vec3 => [d.X(), d.Y(), d.Z()];
const opposite = ([x, y, z]: Vec3): Vec3 => [-x, -y, -z];

/** A body of the kernel as plain data; the kernel's lengths are millimetres, whatever the file's unit was. */
export function solidFromShape(kernel: Kernel, body: TopoDS_Shape): Solid {
  const { TopAbs_FACE, TopAbs_WIRE, TopAbs_EDGE, TopAbs_VERTEX } = kernel.TopAbs_ShapeEnum;
  const forwards = kernel.TopAbs_Orientation.TopAbs_FORWARD;
  const edgeNumbers = createNumbering(kernel);
  const vertexNumbers = createNumbering(kernel);
  const edges: SolidEdge[] = [];
  const vertices: Vec3[] = [];

  const vertexNumber = (vertex: TopoDS_Shape): number => {
    const at = vertexNumbers(vertex);
    vertices[at] ??= point(kernel.BRep_Tool.Pnt(kernel.TopoDS.Vertex(vertex)));
    return at;
  };
  /** Null for an edge without length, such as the tip of a cone. */
  const edgeNumber = (shape: TopoDS_Shape): number | null => {
    const edge = kernel.TopoDS.Edge(shape.Oriented(forwards));
    if (kernel.BRep_Tool.Degenerated(edge)) return null;
    const at = edgeNumbers(edge);
    if (edges[at]) return at;
    const ends = shapesIn(kernel, edge, TopAbs_VERTEX);
    const from = ends.find((end) => end.Orientation() === forwards) ?? ends[0];
    const to = ends.find((end) => end.Orientation() !== forwards) ?? from;
    if (!from || !to) return null;
    edges[at] = { curve: curveOf(kernel, edge), from: vertexNumber(from), to: vertexNumber(to) };
    return at;
  };

  const faces = shapesIn(kernel, body, TopAbs_FACE).map((shape): SolidFace => {
    const face = kernel.TopoDS.Face(shape);
    const loops = shapesIn(kernel, face, TopAbs_WIRE).map((wire) => endToEnd(
      shapesIn(kernel, wire, TopAbs_EDGE).flatMap((edge): LoopEdge[] => {
        const number = edgeNumber(edge);
        return number === null ? [] : [{ edge: number, forward: edge.Orientation() === forwards }];
      }), edges));
    return { surface: surfaceOf(kernel, face), area: Math.abs(measure(kernel, (sums) => kernel.BRepGProp.SurfaceProperties(face, sums, false, false))), loops };
  });
  const volume = Math.abs(measure(kernel, (sums) => kernel.BRepGProp.VolumeProperties(body, sums, false, false, false)));
  return { faces, edges, vertices, volume };
}

function measure(kernel: Kernel, fill: (sums: InstanceType<Kernel["GProp_GProps"]>) => void): number {
  const sums = new kernel.GProp_GProps();
  fill(sums);
  const value = sums.Mass();
  sums.delete();
  return value;
}

function surfaceOf(kernel: Kernel, face: TopoDS_Face): Surface {
  const adaptor = new kernel.BRepAdaptor_Surface(face, true);
  const kind = adaptor.GetType();
  const flipped = face.Orientation() !== kernel.TopAbs_Orientation.TopAbs_FORWARD;
  const { GeomAbs_Plane, GeomAbs_Cylinder } = kernel.GeomAbs_SurfaceType;
  if (kind === GeomAbs_Plane) {
    const plane = adaptor.Plane();
    const along = direction(plane.Axis().Direction());
    return { kind: "plane", point: point(plane.Location()), normal: flipped !== !plane.Direct() ? opposite(along) : along };
  }
  if (kind === GeomAbs_Cylinder) {
    const cylinder = adaptor.Cylinder();
    return {
      kind: "cylinder", point: point(cylinder.Location()), axis: direction(cylinder.Axis().Direction()), radius: cylinder.Radius(),
      convex: flipped === !cylinder.Direct(),
    };
  }
  return { kind: "other", name: SURFACE_NAMES[kind] ?? "free-form surface" };
}

const SURFACE_NAMES: Readonly<Record<string, string>> = {
  GeomAbs_Cone: "cone", GeomAbs_Sphere: "sphere", GeomAbs_Torus: "rounded edge (torus)", GeomAbs_SurfaceOfRevolution: "surface of revolution",
  GeomAbs_SurfaceOfExtrusion: "extruded curve",
};

function curveOf(kernel: Kernel, edge: InstanceType<Kernel["TopoDS_Edge"]>): SolidEdge["curve"] {
  const adaptor = new kernel.BRepAdaptor_Curve(edge);
  const kind = adaptor.GetType();
  if (kind === kernel.GeomAbs_CurveType.GeomAbs_Line) return { kind: "line" };
  const [first, last] = [adaptor.FirstParameter(), adaptor.LastParameter()];
  if (kind === kernel.GeomAbs_CurveType.GeomAbs_Circle) {
    const circle = adaptor.Circle();
    return {
      kind: "circle", centre: point(circle.Location()), axis: direction(circle.Axis().Direction()), radius: circle.Radius(),
      middle: point(adaptor.EvalD0((first + last) / 2)),
    };
  }
  const chords = new kernel.GCPnts_TangentialDeflection(adaptor, CURVE_TURN, CURVE_CHORD_MM);
  const between = Array.from({ length: Math.max(0, chords.NbPoints() - 2) }, (_, i) => point(chords.Value(i + 2)));
  chords.delete();
  return { kind: "other", between };
}

/** A file may list a loop's edges in any order. */
function endToEnd(loop: readonly LoopEdge[], edges: readonly SolidEdge[]): Loop {
  const end = ({ edge, forward }: LoopEdge, last: boolean) => (forward === last ? edges[edge]?.to : edges[edge]?.from);
  const rest = [...loop];
  const ordered = rest.splice(0, 1);
  while (rest.length > 0) {
    const at = ordered[ordered.length - 1];
    const next = Math.max(0, rest.findIndex((candidate) => at && end(candidate, false) === end(at, true)));
    ordered.push(...rest.splice(next, 1));
  }
  return ordered;
}
