"use client";
import { useMemo } from "react";
import { Plane, Vector3 } from "three";
import type { Vec3 } from "@/bending/geometry/vec3";
import { gaugedEdge } from "@/lib/sheet/gaugedEdge";
import type { PlanModel, StepModel } from "@/lib/sheet/planModel";
import { sectionPlane } from "@/lib/sheet/sectionPlane";
import { stepFrames } from "@/lib/sheet/stepFrames";
import { strokeAt } from "@/lib/sheet/strokeAt";
import { EdgeMark } from "./EdgeMark";
import { FitView } from "./FitView";
import { SectionCaps } from "./SectionCaps";
import { SheetMesh } from "./SheetMesh";
import { StageCanvas } from "./StageCanvas";
import type { StageTheme } from "./stageColours";
import { stageColours } from "./stageColours";
import { stepTarget } from "./stepTarget";
import { ToolMeshes } from "./ToolMeshes";
import type { ViewPreset } from "./viewDirections";

export interface StepSceneProps {
  readonly model: PlanModel;
  readonly step: StepModel;
  /** Place on the stroke's slider, 0 to 1. */
  readonly at: number;
  readonly preset: ViewPreset;
  readonly section: boolean;
  readonly theme: StageTheme;
  readonly label: string;
  readonly onLost: () => void;
}

const between = (a: Vec3, b: Vec3): Vec3 => [(a[0] + b[0]) / 2, (a[1] + b[1]) / 2, (a[2] + b[2]) / 2];

/** One moment of a step, in the machine. */
export default function StepScene({ model, step, at, preset, section, theme, label, onLost }: StepSceneProps) {
  const { angle, lift } = strokeAt(at, step.demanded, step.finished);
  const moment = useMemo(() => stepFrames(model, step, angle), [model, step, angle]);
  const flat = useMemo(() => stepFrames(model, step, 0), [model, step]);
  const target = useMemo(() => stepTarget(model, step), [model, step]);
  const plane = useMemo(() => sectionPlane(model, step, flat), [model, step, flat]);
  const clip = useMemo(() => (section ? [new Plane(new Vector3(0, 0, -1), plane)] : undefined), [section, plane]);
  const edge = useMemo(() => gaugedEdge(model, step, moment.frames), [model, step, moment]);
  const tip = moment.tipHeight + lift;
  return (
    <StageCanvas theme={theme} label={label} onLost={onLost}>
      <FitView preset={preset} target={target} />
      <SheetMesh part={model.part} frames={moment.frames} angles={moment.angles} theme={theme} clip={clip} />
      <ToolMeshes model={model} step={step} tip={tip} theme={theme} clip={clip} />
      {section ? <SectionCaps model={model} step={step} moment={moment} tip={tip} plane={plane} theme={theme} /> : null}
      {edge ? <EdgeMark from={between(edge[0], edge[3])} to={between(edge[1], edge[2])} radius={Math.max(1, model.part.thickness * 0.8, target.radius * 0.009)} colour={stageColours[theme].mark} /> : null}
    </StageCanvas>
  );
}
