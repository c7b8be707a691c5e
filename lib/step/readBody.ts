import type { TopoDS_Shape } from "replicad-opencascadejs";
import { fail, ok, type Result } from "@/bending/core/result";
import type { Solid } from "@/bending/exchange/step/solid";
import type { Kernel } from "./kernel";
import { meshFromShape } from "./meshFromShape";
import { shapesIn } from "./shapesIn";
import { solidFromShape } from "./solidFromShape";
import type { SolidMesh } from "@/bending/exchange/step/solidMesh";
import { STEP_LIMITS } from "./stepLimits";
import type { BodyFacts, StepProblem } from "@/lib/schemas/stepReading";
import { noSolidProblem, stepTextProblem } from "./stepTextProblem";

export interface StepBody {
  readonly solid: Solid;
  readonly mesh: SolidMesh;
}

const FILE = "/part.stp";
const UNREADABLE: StepProblem = { kind: "unreadable", message: "The file begins and ends as a STEP file, but its contents cannot be read: entities are damaged or missing. Export or copy it again." };

/**
 * A file's one body, or the one asked for (`body`, from 1), as plain data in millimetres. Never throws for what is in the file;
 * a kernel that fell over must not be used again (`unreadable`).
 */
export function readBody(kernel: Kernel, bytes: Uint8Array, body?: number): Result<StepBody, StepProblem> {
  const early = stepTextProblem(bytes);
  if (early) return fail(early);
  try {
    return read(kernel, bytes, body);
  } catch {
    return fail(UNREADABLE);
  }
}

function read(kernel: Kernel, bytes: Uint8Array, wanted: number | undefined): Result<StepBody, StepProblem> {
  kernel.FS.writeFile(FILE, bytes);
  const reader = new kernel.STEPControl_Reader();
  const status = reader.ReadFile(FILE);
  kernel.FS.unlink(FILE);
  if (status !== kernel.IFSelect_ReturnStatus.IFSelect_RetDone) return fail(UNREADABLE);
  reader.TransferRoots(new kernel.Message_ProgressRange());
  if (reader.NbShapes() === 0) return fail(noSolidProblem(bytes));
  const all = reader.OneShape();
  const bodies = all.IsNull() ? [] : shapesIn(kernel, all, kernel.TopAbs_ShapeEnum.TopAbs_SOLID);
  if (bodies.length === 0) return fail(noSolidProblem(bytes));
  if (bodies.length > 1 && wanted === undefined) return fail(severalBodies(kernel, bodies));
  const shape = bodies[(wanted ?? 1) - 1];
  if (!shape) return fail({ kind: "no-solid", message: `There is no body ${wanted}; the file holds ${bodies.length}.` });
  const whole = unified(kernel, shape);
  const count = shapesIn(kernel, whole, kernel.TopAbs_ShapeEnum.TopAbs_FACE).length;
  if (count > STEP_LIMITS.faces) return fail({ kind: "too-many-faces", message: `The body has ${count} faces; at most ${STEP_LIMITS.faces} are read. Leave threads and engraved text out of the export.` });
  const solid = solidFromShape(kernel, whole);
  if (!isFinite(solid)) return fail({ kind: "unreadable", message: "The body has corners that are no numbers, or none at all, or lie farther out than any part: the file is damaged or its units are wrong." });
  return ok({ solid, mesh: meshFromShape(kernel, whole, Math.hypot(...sizeOf(solid))) });
}

/** Makes one face of coplanar neighbours, and one edge of edges in line; the body as it is when that fails. */
function unified(kernel: Kernel, shape: TopoDS_Shape): TopoDS_Shape {
  try {
    const joiner = new kernel.ShapeUpgrade_UnifySameDomain(shape, true, true, false);
    joiner.Build();
    const [joined] = shapesIn(kernel, joiner.Shape(), kernel.TopAbs_ShapeEnum.TopAbs_SOLID);
    return joined ?? shape;
  } catch {
    return shape;
  }
}

function severalBodies(kernel: Kernel, shapes: readonly TopoDS_Shape[]): StepProblem {
  const bodies = shapes.slice(0, STEP_LIMITS.bodies).map((shape, i): BodyFacts => {
    const solid = solidFromShape(kernel, shape);
    return { body: i + 1, faces: solid.faces.length, volume: solid.volume, size: sizeOf(solid) };
  });
  return { kind: "several-bodies", message: `The file holds ${shapes.length} bodies. A part is one body: choose which.`, bodies };
}

/** Corners farther out than this are no part (mm). */
const FARTHEST_MM = 1e6;

function isFinite({ vertices, volume, faces }: Solid): boolean {
  return vertices.length > 0 && volume > 0 && Number.isFinite(volume) && faces.every(({ area }) => Number.isFinite(area))
    && vertices.every((p) => p.every((value) => Math.abs(value) < FARTHEST_MM));
}

function sizeOf({ vertices }: Solid): readonly [number, number, number] {
  const along = (axis: 0 | 1 | 2) => {
    let [least, most] = [Infinity, -Infinity];
    for (const p of vertices) {
      least = Math.min(least, p[axis]);
      most = Math.max(most, p[axis]);
    }
    return most > least ? most - least : 0;
  };
  return [along(0), along(1), along(2)];
}
