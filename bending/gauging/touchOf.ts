import { invariant } from "../core/invariant";
import { applyFrame } from "../geometry/applyFrame";
import { invertFrame } from "../geometry/invertFrame";
import type { PartModel } from "../part/partModel";
import type { Hit } from "../clearance/hit";
import type { GaugeOption } from "../setup/gaugeOption";
import type { Touch } from "./gaugedStep";
import { levelFrames } from "./levelFrames";

/** A face that is touched on its outside stands upright, or lies level behind the fold of its hem. */
const LYING = 0.5;

/**
 * Where the fingers touch for one way of gauging. An edge is touched in its middle. A flange that stands upright is
 * touched from the finger's rest up to `fingerHeight` above it; of that its error is taken at the end that is farther from the
 * sheet's level, where a wrong angle moves it most.
 */
export function touchOf(part: PartModel, hit: Hit, option: Pick<GaugeOption, "face" | "edge" | "on" | "x" | "slope" | "r">, fingerHeight: number): Touch {
  const [face, frame] = [part.faces[option.face], levelFrames(part, hit)[option.face]];
  invariant(face && frame, "the fingers touch a face of the part");
  const { outline } = face;
  if (option.on === "edge") {
    const [p, q] = [outline[option.edge], outline[(option.edge + 1) % outline.length]];
    invariant(p && q, "the fingers touch an edge of the face");
    return { face: option.face, point: [(p[0] + q[0]) / 2, (p[1] + q[1]) / 2, part.thickness / 2], slope: option.slope };
  }
  const hem = face.bend === null ? undefined : part.bends[face.bend];
  const under = levelFrames(part, hit)[hem?.parent ?? -1];
  if (face.bend !== null && hem && under && Math.abs(frame.z[0]) < LYING) {
    return { face: hem.parent, point: applyFrame(invertFrame(under), [option.x, option.r, 0]), slope: 0, fold: face.bend };
  }
  const placed = outline.map((p) => applyFrame(frame, [p[0], p[1], 0]));
  const heights = placed.map(([, y]) => y);
  const alongBed = placed.map(([, , z]) => z);
  const [low, high] = [Math.min(...heights), Math.max(...heights)];
  const y = low >= 0 ? Math.min(high, option.r + fingerHeight) : Math.max(low, option.r);
  return { face: option.face, point: applyFrame(invertFrame(frame), [option.x, y, (Math.min(...alongBed) + Math.max(...alongBed)) / 2]), slope: 0 };
}
