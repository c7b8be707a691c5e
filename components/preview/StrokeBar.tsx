"use client";
import { ChevronLeft, ChevronRight, Pause, Play } from "lucide-react";
import { IconButton } from "@/components/ui/IconButton";
import { strokeAt } from "@/lib/sheet/strokeAt";
import type { Stroke } from "./useStroke";

interface StrokeBarProps {
  readonly stroke: Stroke;
  readonly step: number;
  readonly steps: number;
  readonly onStep: (step: number) => void;
  readonly demanded: number;
  readonly finished: number;
  readonly large: boolean;
}

/** Step back and on, play, and the slider through the stroke with the angle it stands at. */
export function StrokeBar({ stroke, step, steps, onStep, demanded, finished, large }: StrokeBarProps) {
  const { angle, lift } = strokeAt(stroke.at, demanded, finished);
  const degrees = ((angle * 180) / Math.PI).toFixed(1);
  return (
    <div className="flex items-center gap-2 border-t border-rule p-2">
      {large ? <button type="button" aria-label={stroke.playing ? "Pause" : "Play"} onClick={stroke.toggle} className="flex size-16 shrink-0 items-center justify-center border-2 border-rule-strong [&_svg]:size-8">{stroke.playing ? <Pause aria-hidden /> : <Play aria-hidden />}</button> : <>
      <IconButton label="Step before" disabled={step === 0} onClick={() => onStep(step - 1)}><ChevronLeft aria-hidden /></IconButton>
      <span className="num whitespace-nowrap">{step + 1} / {steps}</span>
      <IconButton label="Next step" disabled={step + 1 >= steps} onClick={() => onStep(step + 1)}><ChevronRight aria-hidden /></IconButton>
      <IconButton label={stroke.playing ? "Pause" : "Play"} onClick={stroke.toggle}>{stroke.playing ? <Pause aria-hidden /> : <Play aria-hidden />}</IconButton>
      </>}
      <input type="range" min={0} max={1} step={0.005} value={stroke.at} onChange={(event) => stroke.scrub(Number(event.target.value))} aria-label="Place in the stroke"
        aria-valuetext={`${degrees} degrees`} className={`min-w-16 grow accent-(--accent) ${large ? "h-16" : ""}`} />
      <output className="num w-32 text-right">{degrees}°{lift > 0 ? <span className="text-ink-faint"> ram up</span> : null}</output>
    </div>
  );
}
