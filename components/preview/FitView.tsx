"use client";
import { OrbitControls } from "@react-three/drei";
import { useThree } from "@react-three/fiber";
import { useEffect, useRef, type ComponentRef } from "react";
import { OrthographicCamera } from "three";
import { fitCamera } from "./fitCamera";
import { viewDirections, type ViewPreset } from "./viewDirections";

export interface FitTarget {
  readonly centre: readonly [number, number, number];
  readonly radius: number;
}

/** Orbiting, and a view that holds the target: from the preset's side when that changes, else from where the eye stands. */
export function FitView({ preset, target }: { readonly preset: ViewPreset; readonly target: FitTarget }) {
  const get = useThree((state) => state.get);
  const { width, height } = useThree((state) => state.size);
  const controls = useRef<ComponentRef<typeof OrbitControls>>(null);
  const shown = useRef<ViewPreset | null>(null);
  useEffect(() => {
    const { camera, invalidate } = get();
    if (!(camera instanceof OrthographicCamera) || !controls.current) return;
    const direction = shown.current === preset ? camera.position.clone().sub(controls.current.target) : viewDirections[preset];
    shown.current = preset;
    fitCamera(camera, controls.current, target, direction, Math.min(width, height));
    invalidate();
  }, [get, preset, target, width, height]);
  return <OrbitControls ref={controls} makeDefault enableDamping={false} />;
}
