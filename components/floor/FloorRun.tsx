"use client";
import { ChevronLeft, ChevronRight } from "lucide-react";
import { useState, type ReactNode } from "react";
import type { FlatChange } from "@/lib/schemas/views";
import type { SheetView } from "@/lib/sheet/sheetView";
import { BedScreen } from "./BedScreen";
import { BendScreen } from "./BendScreen";
import { FlatChanged } from "./FlatChanged";
import { FloorFrame } from "./FloorFrame";
import { MeasureScreen } from "./MeasureScreen";
import { PickScreen } from "./PickScreen";
import { SafetyScreen } from "./SafetyScreen";
import { useStepKeys } from "./useStepKeys";
import { useWakeLock } from "./useWakeLock";

/** Screen after screen: cautions, tools, bed, every bend, first part. By tap, by key or by a foot switch. */
export function FloorRun({ view, superseded, flatChange }: { readonly view: SheetView; readonly superseded: boolean; readonly flatChange: FlatChange | null }) {
  const [at, setAt] = useState(0);
  const [placed, setPlaced] = useState<ReadonlySet<string>>(new Set());
  const bends = view.steps.length;
  const last = bends + 3;
  const go = (to: number): void => setAt(Math.min(last, Math.max(0, to)));
  useStepKeys(() => go(at + 1), () => go(at - 1));
  useWakeLock();
  const toggle = (piece: string): void => setPlaced((old) => new Set(old.has(piece) ? [...old].filter((id) => id !== piece) : [...old, piece]));
  const bend = at - 3;
  return (
    <FloorFrame title={<><span className="num">{view.header.number}</span> {view.header.partName} <span className="text-ink-soft">rev {view.header.revision}</span></>} back={{ href: "/floor", label: "Sheets" }}
      aside={<p className="text-xl whitespace-nowrap text-ink-soft" aria-live="polite">{placeText(at, bends)}</p>}>
      {superseded ? <p role="alert" className="border-y-2 border-brick bg-brick-wash px-5 py-3 text-2xl font-semibold text-brick-ink">Superseded while it was open: stop, and take the new sheet from the list.</p> : null}
      {flatChange !== null && (at === 0 || at === last) ? <FlatChanged change={flatChange} /> : null}
      <main id="content" className="flex min-h-0 grow flex-col overflow-y-auto">
        {screen(at, { view, placed, toggle, go, bend })}
      </main>
      <nav aria-label="Steps" className="sticky bottom-0 grid grid-cols-[1fr_2fr] gap-2 border-t border-rule bg-paper p-2">
        <Tap onClick={() => go(at - 1)} off={at === 0}><ChevronLeft aria-hidden />Back</Tap>
        <Tap onClick={() => go(at === last ? 3 : at + 1)} strong>{nextText(at, bends)}<ChevronRight aria-hidden /></Tap>
      </nav>
    </FloorFrame>
  );
}

interface ScreenFacts { readonly view: SheetView; readonly placed: ReadonlySet<string>; readonly toggle: (piece: string) => void; readonly go: (to: number) => void; readonly bend: number }

function screen(at: number, { view, placed, toggle, go, bend }: ScreenFacts): ReactNode {
  const step = view.steps[bend];
  if (at === 0) return <SafetyScreen view={view} />;
  if (at === 1) return <PickScreen view={view} placed={placed} onToggle={toggle} />;
  if (at === 2) return <BedScreen view={view} placed={placed} />;
  return step ? <BendScreen view={view} step={step} onStep={(index) => go(index + 3)} /> : <MeasureScreen view={view} />;
}

const placeText = (at: number, bends: number): string =>
  at === 0 ? "Before you start" : at === 1 ? "Tools" : at === 2 ? "Bed" : at < bends + 3 ? `Bend ${at - 2} of ${bends}` : "First part";

const nextText = (at: number, bends: number): string =>
  at === 0 ? "Tools" : at === 1 ? "Bed" : at === 2 ? "First bend" : at < bends + 2 ? "Next bend" : at === bends + 2 ? "Part done" : "Next part";

function Tap({ onClick, off = false, strong = false, children }: { readonly onClick: () => void; readonly off?: boolean; readonly strong?: boolean; readonly children: ReactNode }) {
  return (
    <button type="button" onClick={onClick} disabled={off}
      className={`flex min-h-20 items-center justify-center gap-3 border-2 text-3xl font-semibold disabled:opacity-30 [&_svg]:size-9 ${strong ? "border-accent bg-accent text-accent-on" : "border-rule-strong bg-sheet"}`}>
      {children}
    </button>
  );
}
