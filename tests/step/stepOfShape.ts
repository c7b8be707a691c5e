import type { TopoDS_Shape } from "replicad-opencascadejs";
import type { Kernel } from "@/lib/step/kernel";

const FILE = "/written.stp";

/** A body as the bytes of a STEP file, written by the kernel. */
export function stepOfShape(kernel: Kernel, shape: TopoDS_Shape): Uint8Array {
  const writer = new kernel.STEPControl_Writer();
  writer.Transfer(shape, kernel.STEPControl_StepModelType.STEPControl_AsIs, true, new kernel.Message_ProgressRange());
  writer.Write(FILE);
  const bytes = kernel.FS.readFile(FILE);
  kernel.FS.unlink(FILE);
  return bytes;
}
