"use client";
import { useMemo } from "react";
import { DoubleSide, Shape, ShapeGeometry, Vector2 } from "three";
import type { Vec2 } from "@/bending/geometry/vec2";
import type { PlanModel, StepModel } from "@/lib/sheet/planModel";
import { prismSection } from "@/lib/sheet/prismSection";
import { sheetPrisms } from "@/lib/sheet/sheetPrisms";
import type { StrokeMoment } from "@/lib/sheet/stepFrames";
import { stageColours, type StageTheme } from "./stageColours";
import { useDispose } from "./useDispose";

interface SectionCapsProps {
  readonly model: PlanModel;
  readonly step: StepModel;
  readonly moment: StrokeMoment;
  readonly tip: number;
  readonly plane: number;
  readonly theme: StageTheme;
}

/** The cut faces of sheet and tools in the plane of the section. */
export function SectionCaps({ model, step, moment, tip, plane, theme }: SectionCapsProps) {
  const sheet = useMemo(
    () => sheetPrisms(model.part, moment.frames, moment.angles, 12).map((prism) => prismSection(prism, plane)).filter((polygon) => polygon.length > 2),
    [model, moment, plane],
  );
  const colours = stageColours[theme];
  const stands = model.stations.flatMap((station) => station.pieces.filter((piece) => piece.from <= plane && plane <= piece.to).map((piece) => ({ piece, station })));
  return (
    <group position={[0, 0, plane + 0.02]}>
      <Cap polygons={sheet} colour={colours.cut} />
      {stands.map(({ piece, station }) => {
        const punch = piece.kind === "punch";
        const tool = punch ? station.punch : station.die;
        const y = punch ? tip + step.punch.height - tool.height : tool.height - step.die.height;
        return <Cap key={`${station.id} ${piece.kind}`} polygons={[tool.profile.map(([px, py]): Vec2 => [px, py + y])]} colour={punch ? colours.punch : colours.die} />;
      })}
    </group>
  );
}

function Cap({ polygons, colour }: { readonly polygons: readonly (readonly Vec2[])[]; readonly colour: string }) {
  const geometry = useMemo(() => new ShapeGeometry(polygons.map((polygon) => new Shape(polygon.map(([x, y]) => new Vector2(x, y))))), [polygons]);
  useDispose(geometry);
  return <mesh geometry={geometry}><meshBasicMaterial color={colour} side={DoubleSide} /></mesh>;
}
