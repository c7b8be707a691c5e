"use client";
import { useId } from "react";
import type { Vec2 } from "@/bending/geometry/vec2";
import type { Machine } from "@/bending/tooling/machine";
import { DimensionLine } from "@/components/ui/drawing/DimensionLine";
import { DrawingSheet } from "@/components/ui/drawing/DrawingSheet";
import { fitView } from "@/components/ui/drawing/fitView";
import { Hatch } from "@/components/ui/drawing/Hatch";
import { pathOf } from "@/components/ui/drawing/pathOf";
import { formatLength } from "@/lib/format/formatLength";

/** Side view of the empty brake, ram up: ram, bed, a finger of the back gauge, and the daylight between the seats. */
export function MachineDrawing({ machine }: { readonly machine: Machine }) {
  const hatch = useId();
  const ram = machine.ramProfile.map(([x, y]): Vec2 => [x, y + machine.daylight]);
  const finger = machine.gauge.fingerProfile.map(([x, y]): Vec2 => [x + Math.min(120, machine.gauge.x[1]), y + 80]);
  const view = fitView([...ram, ...machine.bedProfile, ...finger], { width: 420, maxHeight: 420, minHeight: 260, margin: [70, 24, 40, 24] });
  const xs = [...ram, ...machine.bedProfile].map(([x]) => x);
  const left = Math.min(...xs);
  return (
    <DrawingSheet title="Side view, empty, ram up" note="operator on the left" width={view.width} height={view.height}
      description={`Side view of ${machine.name}, daylight ${formatLength(machine.daylight, "mm")}`}>
      <defs><Hatch id={hatch} /></defs>
      {[ram, machine.bedProfile].map((profile, i) => <path key={i} d={pathOf([profile], view.at)} fill={`url(#${hatch})`} stroke="var(--ink)" strokeWidth="1.2" strokeLinejoin="round" />)}
      <path d={pathOf([finger], view.at)} fill="var(--accent-wash)" stroke="var(--accent)" strokeWidth="1.1" strokeLinejoin="round" />
      <DimensionLine from={view.at([left, 0])} to={view.at([left, machine.daylight])} offset={30} label={`daylight ${formatLength(machine.daylight, "mm", false)}`} />
    </DrawingSheet>
  );
}
