"use client";
import { useId } from "react";

/** A scale drawn along an edge: a tick each 8 px, a longer one each fifth. */
export function Ruler({ className }: { readonly className?: string }) {
  const id = useId();
  return (
    <svg aria-hidden width="100%" height="7" className={className}>
      <defs>
        <pattern id={id} width="40" height="7" patternUnits="userSpaceOnUse">
          <path d="M0.5 0v7M8.5 0v3M16.5 0v3M24.5 0v3M32.5 0v3" stroke="var(--steel-400)" strokeWidth="1" />
        </pattern>
      </defs>
      <rect width="100%" height="7" fill={`url(#${id})`} />
    </svg>
  );
}
