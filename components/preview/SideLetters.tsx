"use client";
import { useMemo } from "react";
import { CanvasTexture, Matrix4 } from "three";
import type { Frame } from "@/bending/geometry/frame";
import { polygonBounds } from "@/bending/geometry/polygonBounds";
import type { PartModel } from "@/bending/part/partModel";
import { frameMatrix } from "./frameMatrix";
import { stageColours, type StageTheme } from "./stageColours";
import { useDispose } from "./useDispose";

/** "TOP" on the base's top, "UNDER" on its underside, lying on the sheet. */
export function SideLetters({ part, frames, theme }: { readonly part: PartModel; readonly frames: readonly Frame[]; readonly theme: StageTheme }) {
  const base = part.faces[0];
  const frame = frames[0];
  const ink = stageColours[theme].letter;
  const a = useMemo(() => wordTexture("TOP", ink), [ink]);
  const b = useMemo(() => wordTexture("UNDER", ink), [ink]);
  useDispose(a);
  useDispose(b);
  if (!base || !frame) return null;
  const { min: [left, bottom], max: [right, top] } = polygonBounds(base.outline);
  const size = Math.min(right - left, top - bottom, 120) * 0.9;
  const at = (z: number, turned: boolean): Matrix4 =>
    frameMatrix(frame).multiply(new Matrix4().makeTranslation((left + right) / 2, (bottom + top) / 2, z)).multiply(new Matrix4().makeRotationY(turned ? Math.PI : 0));
  return (
    <>
      <Letter texture={a} matrix={at(part.thickness + 0.15, false)} size={size} />
      <Letter texture={b} matrix={at(-0.15, true)} size={size} />
    </>
  );
}

function Letter({ texture, matrix, size }: { readonly texture: CanvasTexture; readonly matrix: Matrix4; readonly size: number }) {
  return (
    <mesh matrixAutoUpdate={false} matrix={matrix}>
      <planeGeometry args={[size, size]} />
      <meshBasicMaterial map={texture} transparent depthWrite={false} />
    </mesh>
  );
}

function wordTexture(word: string, ink: string): CanvasTexture {
  const canvas = document.createElement("canvas");
  canvas.width = canvas.height = 256;
  const context = canvas.getContext("2d");
  if (context) {
    context.fillStyle = ink;
    context.font = "700 68px Barlow, sans-serif";
    context.textAlign = "center";
    context.textBaseline = "middle";
    context.fillText(word, 128, 134);
  }
  return new CanvasTexture(canvas);
}
