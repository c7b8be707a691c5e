import type { TopAbs_ShapeEnum, TopoDS_Shape } from "replicad-opencascadejs";
import type { Kernel } from "./kernel";

/** The parts of a shape that are of one kind, each as often as it is met, with its orientation there. */
export function shapesIn(kernel: Kernel, shape: TopoDS_Shape, kind: TopAbs_ShapeEnum): readonly TopoDS_Shape[] {
  const found: TopoDS_Shape[] = [];
  const walk = new kernel.TopExp_Explorer(shape, kind, kernel.TopAbs_ShapeEnum.TopAbs_SHAPE);
  for (; walk.More(); walk.Next()) found.push(walk.Current());
  walk.delete();
  return found;
}
