"use client";
import { Canvas } from "@react-three/fiber";
import type { ReactNode } from "react";
import { stageColours, type StageTheme } from "./stageColours";

interface StageCanvasProps {
  readonly theme: StageTheme;
  readonly label: string;
  readonly onLost: () => void;
  readonly children: ReactNode;
}

/** Light, camera and canvas; drawn only when something changes. */
export function StageCanvas({ theme, label, onLost, children }: StageCanvasProps) {
  return (
    <Canvas orthographic frameloop="demand" dpr={[1, 2]} gl={{ preserveDrawingBuffer: true, antialias: true, localClippingEnabled: true }} role="img" aria-label={label}
      onCreated={({ gl }) => {
        gl.localClippingEnabled = true;
        gl.domElement.addEventListener("webglcontextlost", onLost);
      }}>
      <color attach="background" args={[stageColours[theme].ground]} />
      <hemisphereLight args={["#ffffff", "#b8b2a4", 1.6]} />
      <directionalLight position={[-900, 700, 300]} intensity={1.5} />
      <directionalLight position={[-100, 300, 900]} intensity={0.9} />
      <directionalLight position={[500, 300, -700]} intensity={0.7} />
      {children}
    </Canvas>
  );
}
