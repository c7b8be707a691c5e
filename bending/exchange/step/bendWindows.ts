import { SOLID_MATCH_MM } from "../../core/tolerance";
import type { Frame } from "../../geometry/frame";
import { chainRims, type PlateRim } from "./chainRims";
import type { GrownBend } from "./growTree";
import { leaningRuns } from "./leaningRuns";
import type { BendWindow } from "./recognisedPart";
import type { Solid } from "./solid";
import { unrollBend, type BendRun } from "./unrollBend";
import { zoneHoles } from "./zoneHoles";

export interface BendWindows {
  readonly windows: readonly BendWindow[];
  /** Cut-outs that are left closed: into the bend from one plate, and on one side of the bend only. */
  readonly closed: number;
  readonly blind: number;
  /** Holes wholly inside the bend that are wider on one side. */
  readonly widened: number;
  /** Rims of cut-outs that are not square to the sheet; taken as they are on `face`, the round face on the base's side. */
  readonly leaning: number;
  readonly face: number | null;
  /** Ends of the bend that are not straight. */
  readonly crooked: number;
}

/** Everything that is cut out of a bend, by the round face on the base's side: across it, into it from one plate, wholly inside it. */
export function bendWindows(solid: Solid, bend: GrownBend, child: Frame, rims: readonly PlateRim[]): BendWindows {
  const { joint, direction, parentEdges, childEdges } = bend;
  const first = (direction === "up" ? joint.inner : joint.outer)[0].edges === parentEdges ? 0 : 1;
  const beneath = direction === "up" ? joint.outer : joint.inner;
  const facesOn = (onTop: boolean) => joint.faces.filter((face) => {
    const surface = solid.faces[face]?.surface;
    return surface?.kind === "cylinder" && (surface.convex === (direction === "down")) === onTop;
  });
  const unrolled = (onTop: boolean) => facesOn(onTop).map((face) => unrollBend(solid, face, onTop ? { parent: parentEdges, child: childEdges } : { parent: beneath[first].edges, child: beneath[first === 0 ? 1 : 0].edges }, child, joint.angle));
  const [top, under] = [unrolled(true), unrolled(false)];
  const runs = top.flatMap((face) => face.runs);
  const chained = chainRims(rims, runs);
  const straight = straightAcross(chained.open);
  const arc = joint.angle * Math.max(joint.insideRadius, ...joint.faces.map((face) => radiusOf(solid, face)));
  const inside = zoneHoles(top.flatMap(({ holes }) => holes), under.flatMap(({ holes }) => holes), arc);
  return {
    windows: [...chained.windows, ...straight.map((pair) => ({ pieces: pair.map(({ on, rim }) => ({ on, rim })) })), ...inside.windows],
    closed: chained.open.length - 2 * straight.length,
    blind: inside.blind,
    widened: inside.widened,
    leaning: leaningRuns(runs.filter((run) => !chained.unused.includes(run)), under.flatMap((face) => face.runs), arc),
    face: facesOn(true)[0] ?? null,
    crooked: straight.length > 0 ? 0 : chained.unused.filter(isCrooked).length,
  };
}

/** Rims that the round faces do not join (a sharp bend has none): one on each plate, facing one another, straight through the bend. */
function straightAcross(rims: readonly PlateRim[]): readonly (readonly [PlateRim, PlateRim])[] {
  return rims.filter(({ on }) => on === "parent").flatMap((rim) => {
    const middle = (rim.from + rim.to) / 2;
    const facing = rims.find(({ on, from, to }) => on === "child" && Math.min(from, to) < middle && Math.max(from, to) > middle);
    return facing ? [[rim, facing] as const] : [];
  });
}

const radiusOf = (solid: Solid, face: number): number => {
  const surface = solid.faces[face]?.surface;
  return surface?.kind === "cylinder" ? surface.radius : 0;
};

/** A rim of the bend, from one plate to the other, that leaves the straight line between its ends. */
function isCrooked({ from, to, path }: BendRun): boolean {
  const sense = from.on === "parent" ? 1 : -1;
  return path.some(([along, turn]) => {
    const part = sense > 0 ? turn : 1 - turn;
    return Math.abs(along - from.along - (to.along - from.along) * part) > SOLID_MATCH_MM;
  });
}
