import { applyFrame } from "@/bending/geometry/applyFrame";
import type { Vec2 } from "@/bending/geometry/vec2";
import type { Vec3 } from "@/bending/geometry/vec3";
import { arrowShapes } from "./arrowShapes";
import { bendOutlines } from "./bendOutlines";
import { boundsOf } from "./boundsOf";
import { createSheetFormat } from "./createSheetFormat";
import type { Bounds } from "./clipToBox";
import { faceOutlines, type FaceOutline } from "./faceOutlines";
import { finishPicture } from "./finishPicture";
import { gaugedEdge } from "./gaugedEdge";
import type { PictureLabel, PictureShape, StepPicture } from "./pictureShape";
import type { PlanModel, StepModel } from "./planModel";
import { stepFrames, type StrokeMoment } from "./stepFrames";
import { upSide } from "./upSide";

/** The step seen from above before the stroke: the operator stands at the bottom, the back gauge is at the top. */
export function stepAbove(model: PlanModel, step: StepModel): StepPicture {
  const before = stepFrames(model, step, 0);
  const faces = [...faceOutlines(model.part, before.frames, 1, look)].sort((a, b) => a.depth - b.depth);
  const sheet = boundsOf(faces.map((face) => face.points));
  const lettering = Math.max(sheet[2] - sheet[0], sheet[3] - sheet[1]) * 0.05 + 3;
  const bounds = aboveBounds(sheet, step, model, lettering);
  const station = model.stations.find((entry) => entry.id === step.station);
  const shapes: PictureShape[] = [
    ...fingerShapes(model, step),
    ...bendOutlines(model.part, before.frames, before.angles, look).map((points): PictureShape => ({ kind: "bend-zone", closed: true, points })),
    ...faces.map(({ face, points, holes }): PictureShape => ({ kind: face === step.hit.front ? "front-face" : "sheet-beyond", closed: true, points, holes })),
    ...(station ? [band(station.from, station.to)] : []),
    ...bendLines(model, step, before),
    ...edgeShapes(model, step, before),
    ...arrowShapes([bounds[0] + lettering * 1.2, bounds[3] - lettering * 0.4], [bounds[0] + lettering * 1.2, bounds[3] - lettering * 2.4], lettering * 0.8),
  ];
  return finishPicture(shapes, labelsOf(model, step, faces, bounds, lettering), bounds, lettering);
}

const look = ([x, , z]: Vec3): Vec2 => [z, -x];

function aboveBounds([left, top, right, bottom]: Bounds, step: StepModel, model: PlanModel, lettering: number): Bounds {
  const half = model.machine.gauge.fingerWidth / 2;
  const fingers = step.fingers.map((finger) => finger.z);
  return [
    Math.min(left, ...fingers.map((z) => z - half)) - lettering,
    Math.min(top, ...step.fingers.map((finger) => -finger.x)) - lettering * 2.4,
    Math.max(right, ...fingers.map((z) => z + half)) + lettering,
    Math.max(bottom, 0) + lettering * 2.8,
  ];
}

function fingerShapes(model: PlanModel, step: StepModel): readonly PictureShape[] {
  const half = model.machine.gauge.fingerWidth / 2;
  const long = Math.max(...model.machine.gauge.fingerProfile.map(([x]) => x));
  return step.fingers.map(({ x, z }) => ({
    kind: "finger", closed: true, points: [[z - half, -x], [z + half, -x], [z + half, -x - long], [z - half, -x - long]],
  }));
}

const band = (from: number, to: number): PictureShape => ({ kind: "tool-extent", closed: true, points: [[from, -3], [to, -3], [to, 3], [from, 3]] });

function bendLines(model: PlanModel, step: StepModel, before: StrokeMoment): readonly PictureShape[] {
  return model.part.bends.flatMap((bend, index): PictureShape[] => {
    const frame = before.frames[bend.parent];
    if (!frame) return [];
    const now = step.hit.bends.includes(index);
    const kind = now ? "bend-line" : (step.formed[index] ?? 0) > 0 ? "bend-done" : "bend-to-come";
    const top = frame.z[1] >= 0 ? model.part.thickness : 0;
    return [{ kind, closed: false, points: bend.line.map(([x, y]) => look(applyFrame(frame, [x, y, top]))) }];
  });
}

function edgeShapes(model: PlanModel, step: StepModel, before: StrokeMoment): readonly PictureShape[] {
  const edge = gaugedEdge(model, step, before.frames);
  return edge ? [{ kind: "gauged-edge", closed: false, points: [look(edge[0]), look(edge[1])] }] : [];
}

function labelsOf(model: PlanModel, step: StepModel, faces: readonly FaceOutline[], bounds: Bounds, lettering: number): readonly PictureLabel[] {
  const wide = [...faces].filter((face) => !face.edgeOn).sort((a, b) => area(b.points) - area(a.points))[0];
  const [left, top, right, bottom] = boundsOf(wide ? [wide.points] : []);
  return [
    { kind: "up", text: upSide(model, step), at: [(left + right) / 2, (top + bottom) / 2 + lettering * 0.7], anchor: "middle" },
    { kind: "front", text: "operator", at: [bounds[0] + lettering * 2.2, bounds[3] - lettering * 0.7], anchor: "start" },
    { kind: "gauge", text: `X ${createSheetFormat(model.units).gauge(step.gaugeX)}`, at: [fingerMiddle(step), bounds[1] + lettering * 1.3], anchor: "middle" },
  ];
}

const fingerMiddle = ({ fingers, bendZ }: StepModel): number =>
  fingers.length === 0 ? (bendZ[0] + bendZ[1]) / 2 : fingers.reduce((sum, finger) => sum + finger.z, 0) / fingers.length;

function area(points: readonly Vec2[]): number {
  return Math.abs(points.reduce((sum, [x, y], i) => {
    const [nx, ny] = points[(i + 1) % points.length] ?? [x, y];
    return sum + x * ny - nx * y;
  }, 0)) / 2;
}
