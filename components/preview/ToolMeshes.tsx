"use client";
import type { Plane } from "three";
import type { PlanModel, StepModel } from "@/lib/sheet/planModel";
import { ProfileMesh } from "./ProfileMesh";
import { stageColours, type StageTheme } from "./stageColours";

interface ToolMeshesProps {
  readonly model: PlanModel;
  readonly step: StepModel;
  /** Height of this step's punch tip. */
  readonly tip: number;
  readonly theme: StageTheme;
  readonly clip?: readonly Plane[] | undefined;
}

/** Every station's pieces where they stand, ram, bed and the gauge's fingers. Tools of other heights hang from the same ram. */
export function ToolMeshes({ model, step, tip, theme, clip }: ToolMeshesProps) {
  const colours = stageColours[theme];
  const { machine } = model;
  const ram = tip + step.punch.height;
  const seat = -step.die.height;
  const half = machine.bedLength / 2;
  const finger = machine.gauge.fingerWidth / 2;
  return (
    <group>
      {model.stations.flatMap((station) => station.pieces.map((piece) => {
        const punch = piece.kind === "punch";
        const tool = punch ? station.punch : station.die;
        return (
          <ProfileMesh key={`${station.id} ${piece.kind} ${piece.from}`} profile={tool.profile} from={piece.from} to={piece.to} y={punch ? ram - tool.height : seat + tool.height}
            colour={punch ? colours.punch : colours.die} line={colours.toolLine} clip={clip} />
        );
      }))}
      <ProfileMesh profile={machine.ramProfile} from={-half} to={half} y={ram} colour={colours.ram} line={colours.toolLine} clip={clip} glass />
      <ProfileMesh profile={machine.bedProfile} from={-half} to={half} y={seat} colour={colours.ram} line={colours.toolLine} clip={clip} glass />
      {step.fingers.map(({ x, r, z }, index) => (
        <ProfileMesh key={index} profile={machine.gauge.fingerProfile} from={z - finger} to={z + finger} x={x} y={r} colour={colours.finger} line={colours.toolLine} />
      ))}
    </group>
  );
}
