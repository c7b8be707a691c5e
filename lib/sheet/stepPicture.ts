import type { Vec2 } from "@/bending/geometry/vec2";
import type { ProfilePoint } from "@/bending/geometry/vec2";
import { arrowShapes } from "./arrowShapes";
import { bendOutlines } from "./bendOutlines";
import { boundsOf } from "./boundsOf";
import type { Bounds } from "./clipToBox";
import { createSheetFormat } from "./createSheetFormat";
import { faceOutlines } from "./faceOutlines";
import { finishPicture } from "./finishPicture";
import { gaugedEdge } from "./gaugedEdge";
import type { PictureLabel, PictureShape, StepPicture } from "./pictureShape";
import type { PlanModel, StepModel } from "./planModel";
import { prismSection } from "./prismSection";
import { sectionPlane } from "./sectionPlane";
import { sheetPrisms } from "./sheetPrisms";
import { stepFrames, type StrokeMoment } from "./stepFrames";
import { upSide } from "./upSide";

/** mm. Farthest that the drawing reaches to the front and to the back of the bend. */
const REACH_MM = 240;

/** What a drawing of a stroke that cannot be made is about: where the part is cut, and the faces that meet something. */
export interface MetAt {
  /** z along the bed, mm. */
  readonly plane: number;
  /** Indices of faces. */
  readonly faces: readonly number[];
}

/**
 * The step seen along the bed from its right end: a section through the bend with the operator on the left and the back gauge
 * on the right; the sheet before the stroke and bent, punch down (or at another moment of the stroke). With `met` the stroke cannot be made:
 * nothing is gauged, and the faces that are in the way are marked.
 */
export function stepPicture(model: PlanModel, step: StepModel, moment: { readonly angle: number; readonly lift: number } = { angle: step.finished, lift: 0 }, met: MetAt | null = null): StepPicture {
  const before = stepFrames(model, step, 0);
  const after = stepFrames(model, step, moment.angle);
  const plane = met?.plane ?? sectionPlane(model, step, before);
  const cutBefore = met ? [] : sections(model, before, plane).map(({ points }) => points);
  const cutAfter = sections(model, after, plane);
  const tools = toolShapes(model, step, after.tipHeight + moment.lift, met === null);
  const bounds = pictureBounds([...cutAfter.map(({ points }) => points), ...tools.near.map((shape) => shape.points)], cutBefore);
  const lettering = letteringOf(bounds);
  const shapes: PictureShape[] = [
    ...tools.far,
    ...beyond(model, after),
    ...tools.near,
    ...cutBefore.map((points): PictureShape => ({ kind: "sheet-before", closed: true, points })),
    ...cutAfter.map(({ points, face }): PictureShape => ({ kind: met?.faces.includes(face) ? "sheet-met" : "sheet-cut", closed: true, points })),
    ...(met ? [] : edgeMark(model, step, before)),
  ];
  const marks = met ? { shapes: [], labels: sides(bounds, lettering) } : signs(model, step, bounds, lettering);
  return finishPicture([...shapes, ...marks.shapes], marks.labels, bounds, lettering);
}

const letteringOf = ([left, top, right, bottom]: Bounds): number => Math.max(right - left, bottom - top) * 0.045;
const look = ([x, y]: readonly [number, number, number]): Vec2 => [x, -y];
const placed = (profile: readonly ProfilePoint[], x: number, y: number): readonly Vec2[] => profile.map(([px, py]) => [px + x, -(py + y)]);

function sections(model: PlanModel, moment: StrokeMoment, plane: number): readonly { readonly points: readonly Vec2[]; readonly face: number }[] {
  return sheetPrisms(model.part, moment.frames, moment.angles)
    .map((prism) => ({ points: prismSection(prism, plane).map(([x, y]): Vec2 => [x, -y]), face: prism.face ?? -1 }))
    .filter(({ points }) => points.length > 2);
}

function beyond(model: PlanModel, moment: StrokeMoment): readonly PictureShape[] {
  const faces = [...faceOutlines(model.part, moment.frames, 2, look)].sort((a, b) => a.depth - b.depth);
  return [
    ...bendOutlines(model.part, moment.frames, moment.angles, look).map((points): PictureShape => ({ kind: "bend-zone", closed: true, points })),
    ...faces.map(({ points, holes }): PictureShape => ({ kind: "sheet-beyond", closed: true, points, holes })),
  ];
}

function toolShapes(model: PlanModel, step: StepModel, tip: number, gauged: boolean): { far: readonly PictureShape[]; near: readonly PictureShape[] } {
  const { machine } = model;
  const closed = (kind: PictureShape["kind"], points: readonly Vec2[]): PictureShape => ({ kind, closed: true, points });
  const finger = step.fingers[0] ?? { x: step.gaugeX, r: step.gaugeR };
  return {
    far: [
      closed("ram", placed(machine.ramProfile, 0, tip + step.punch.height)),
      closed("bed", placed(machine.bedProfile, 0, -step.die.height)),
      ...(gauged ? [closed("finger", placed(machine.gauge.fingerProfile, finger.x, finger.r))] : []),
    ],
    near: [closed("die", placed(step.die.profile, 0, 0)), closed("punch", placed(step.punch.profile, 0, tip))],
  };
}

/** Tools and the bent sheet whole, a little of ram and bed, and as much of the flat sheet as stays near. */
function pictureBounds(whole: readonly (readonly Vec2[])[], flat: readonly (readonly Vec2[])[]): Bounds {
  const [left, top, right, bottom] = boundsOf(whole);
  const [flatLeft, , flatRight] = boundsOf(flat);
  const margin = 14;
  const clamp = (value: number): number => Math.max(-REACH_MM, Math.min(REACH_MM, value));
  const bounds: Bounds = [
    clamp(Math.min(left, flatLeft, -70) - margin), Math.max(top, -2 * REACH_MM) - margin,
    clamp(Math.max(right, flatRight, 70) + margin), bottom + margin,
  ];
  // Room on the operator's side for the sign that tells which side is up.
  return [bounds[0] - 4 * letteringOf(bounds), bounds[1], bounds[2], bounds[3]];
}

function edgeMark(model: PlanModel, step: StepModel, before: StrokeMoment): readonly PictureShape[] {
  const edge = gaugedEdge(model, step, before.frames);
  return edge ? [{ kind: "gauged-edge", closed: false, points: [look(edge[0]), look(edge[3])] }] : [];
}

function signs(model: PlanModel, step: StepModel, bounds: Bounds, lettering: number): { shapes: readonly PictureShape[]; labels: readonly PictureLabel[] } {
  const [left, , right] = bounds;
  const thickness = model.part.thickness;
  const at = left + lettering * 1.1;
  const gauge = Math.min(step.gaugeX, right - lettering);
  const small = gauge < lettering * 8;
  const format = createSheetFormat(model.units);
  return {
    shapes: [
      ...arrowShapes([at, -thickness - lettering * 0.3], [at, -thickness - lettering * 2.6], lettering * 0.8),
      ...arrowShapes([gauge - lettering * 3, lettering * 1.2], [gauge, lettering * 1.2], lettering * 0.7),
    ],
    labels: [
      { kind: "up", text: upSide(model, step), at: [at + lettering * 0.8, -thickness - lettering * 1.6], anchor: "start" },
      { kind: "gauge", text: `X ${format.gauge(step.gaugeX)}`, at: [small ? gauge + lettering * 0.4 : gauge, lettering * (small ? 1.6 : 2.6)], anchor: small ? "start" : "end" },
      ...sides(bounds, lettering),
    ],
  };
}

const sides = ([left, top, right]: Bounds, lettering: number): readonly PictureLabel[] => [
  { kind: "front", text: "operator", at: [left + lettering * 0.6, top + lettering * 1.4], anchor: "start" },
  { kind: "note", text: "gauge", at: [right - lettering * 0.6, top + lettering * 1.4], anchor: "end" },
];
