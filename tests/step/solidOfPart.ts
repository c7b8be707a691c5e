import type { gp_Pnt, TopoDS_Shape, TopoDS_Wire } from "replicad-opencascadejs";
import { applyFrame } from "@/bending/geometry/applyFrame";
import { composeFrames } from "@/bending/geometry/composeFrames";
import type { Frame } from "@/bending/geometry/frame";
import { identityFrame } from "@/bending/geometry/identityFrame";
import type { Vec3 } from "@/bending/geometry/vec3";
import { foldFrames } from "@/bending/part/foldFrames";
import type { BulgeVertex, FlatContour, PartModel } from "@/bending/part/partModel";
import type { Kernel } from "@/lib/step/kernel";

/** A folded part as one body of the kernel: each face extruded, each bend turned about its axis, all joined. Placed by `place`. */
export function solidOfPart(kernel: Kernel, part: PartModel, place: Frame = identityFrame): TopoDS_Shape {
  const frames = foldFrames(part, part.bends.map(({ angle }) => angle)).map((frame) => composeFrames(place, frame));
  const at = (frame: Frame, p: Vec3): gp_Pnt => new kernel.gp_Pnt(...applyFrame(frame, p));
  const plates = part.faces.map((face, i) => plateSolid(kernel, frames[i] ?? identityFrame, part.thickness, face.outline.map(([x, y]): BulgeVertex => [x, y, 0]), face.holeContours));
  const bends = part.bends.map((bend) => {
    const frame = frames[bend.parent] ?? identityFrame;
    const [start, , , end] = bend.zone;
    const length = Math.hypot(end[0] - start[0], end[1] - start[1]);
    const along: Vec3 = [(end[0] - start[0]) / length, (end[1] - start[1]) / length, 0];
    const up = bend.direction === "up";
    const height = up ? part.thickness + bend.insideRadius : -bend.insideRadius;
    const section = polygonFace(kernel, [[...start, 0], [...end, 0], [...end, part.thickness], [...start, part.thickness]].map(([x, y, z]) => at(frame, [x ?? 0, y ?? 0, z ?? 0])));
    const sense = up ? -1 : 1;
    const [a, b] = [applyFrame(frame, [0, 0, 0]), applyFrame(frame, along)];
    const axis = new kernel.gp_Ax1(at(frame, [start[0], start[1], height]), new kernel.gp_Dir((b[0] - a[0]) * sense, (b[1] - a[1]) * sense, (b[2] - a[2]) * sense));
    return new kernel.BRepPrimAPI_MakeRevol(section, axis, bend.angle, true).Shape();
  });
  return [...plates, ...bends].reduce((whole, piece) => joined(kernel, whole, piece));
}

const joined = (kernel: Kernel, a: TopoDS_Shape, b: TopoDS_Shape): TopoDS_Shape => new kernel.BRepAlgoAPI_Fuse(a, b, new kernel.Message_ProgressRange()).Shape();

/** A plate of the sheet: outline and holes in the plane of `frame`, raised by the thickness. */
export function plateSolid(kernel: Kernel, frame: Frame, thickness: number, outline: readonly BulgeVertex[], holes: readonly FlatContour[]): TopoDS_Shape {
  const face = new kernel.BRepBuilderAPI_MakeFace(contourWire(kernel, frame, { kind: "path", vertices: outline }), true).Face();
  const up = new kernel.gp_Vec(frame.z[0] * thickness, frame.z[1] * thickness, frame.z[2] * thickness);
  const plate = new kernel.BRepPrimAPI_MakePrism(face, up, true, true).Shape();
  return holes.reduce((rest, hole) => {
    const low: Frame = { ...frame, o: applyFrame(frame, [0, 0, -1]) };
    const punch = new kernel.BRepPrimAPI_MakePrism(new kernel.BRepBuilderAPI_MakeFace(contourWire(kernel, low, hole), true).Face(), new kernel.gp_Vec(...scaled(frame.z, thickness + 2)), true, true).Shape();
    return new kernel.BRepAlgoAPI_Cut(rest, punch, new kernel.Message_ProgressRange()).Shape();
  }, plate);
}

const scaled = ([x, y, z]: Vec3, by: number): [number, number, number] => [x * by, y * by, z * by];

function polygonFace(kernel: Kernel, corners: readonly gp_Pnt[]) {
  const wire = new kernel.BRepBuilderAPI_MakeWire();
  corners.forEach((corner, i) => wire.Add(new kernel.BRepBuilderAPI_MakeEdge(corner, corners[(i + 1) % corners.length] ?? corner).Edge()));
  return new kernel.BRepBuilderAPI_MakeFace(wire.Wire(), true).Face();
}

function contourWire(kernel: Kernel, frame: Frame, contour: FlatContour): TopoDS_Wire {
  const at = (x: number, y: number) => new kernel.gp_Pnt(...applyFrame(frame, [x, y, 0]));
  const wire = new kernel.BRepBuilderAPI_MakeWire();
  const axes = (x: number, y: number) => new kernel.gp_Ax2(at(x, y), new kernel.gp_Dir(...frame.z), new kernel.gp_Dir(...frame.x));
  if (contour.kind === "circle") {
    wire.Add(new kernel.BRepBuilderAPI_MakeEdge(new kernel.gp_Circ(axes(contour.centre[0], contour.centre[1]), contour.radius)).Edge());
    return wire.Wire();
  }
  contour.vertices.forEach(([x, y, bulge], i) => {
    const [u, v] = contour.vertices[(i + 1) % contour.vertices.length] ?? [x, y];
    if (bulge === 0) {
      wire.Add(new kernel.BRepBuilderAPI_MakeEdge(at(x, y), at(u, v)).Edge());
      return;
    }
    const left = 1 / (2 * Math.tan(2 * Math.atan(bulge)));
    const [cx, cy] = [(x + u) / 2 - (v - y) * left, (y + v) / 2 + (u - x) * left];
    const circle = new kernel.gp_Circ(axes(cx, cy), Math.hypot(x - cx, y - cy));
    // The kernel's arc runs counter-clockwise from its first point to its second.
    wire.Add((bulge > 0 ? new kernel.BRepBuilderAPI_MakeEdge(circle, at(x, y), at(u, v)) : new kernel.BRepBuilderAPI_MakeEdge(circle, at(u, v), at(x, y))).Edge());
  });
  return wire.Wire();
}
