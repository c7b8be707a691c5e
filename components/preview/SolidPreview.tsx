"use client";
import { lazy, Suspense, useState, type ReactNode } from "react";
import { DrawnOnFailure } from "./DrawnOnFailure";
import type { SolidSceneProps } from "./SolidScene";
import { useHasWebGl } from "./useHasWebGl";

const SolidScene = lazy(() => import("./SolidScene"));

/** A solid in 3D, filling its parent; `instead` takes its place where 3D is not to be had. */
export function SolidPreview({ instead, ...scene }: Omit<SolidSceneProps, "onLost"> & { readonly instead: ReactNode }) {
  const able = useHasWebGl();
  const [lost, setLost] = useState(false);
  if (able === null) return <div className="size-full" aria-busy />;
  if (!able || lost) return instead;
  return (
    <DrawnOnFailure instead={instead}>
      <Suspense fallback={<div className="size-full" aria-busy />}><SolidScene {...scene} onLost={() => setLost(true)} /></Suspense>
    </DrawnOnFailure>
  );
}
