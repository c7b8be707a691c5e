"use client";
import { toDeg } from "@/bending/core/units";
import { readMachineDocument } from "@/bending/tooling/readMachineDocument";
import { Facts } from "@/components/ui/Facts";
import { Notice } from "@/components/ui/Notice";
import { formatForce } from "@/lib/format/formatForce";
import { formatLength } from "@/lib/format/formatLength";
import { formatNumber } from "@/lib/format/formatNumber";
import type { MachineView } from "@/lib/schemas/views";
import { MachineDrawing } from "./MachineDrawing";

const num = (text: string) => <span className="num">{text}</span>;
const mmOf = (value: number) => num(formatLength(value, "mm"));
const range = ([from, to]: readonly [number, number]) => num(`${formatNumber(from, 1)} to ${formatNumber(to, 1)} mm`);
const seconds = (value: number, each = "s") => num(`${formatNumber(value, 1)} ${each}`);

/** What the brake bears with the load so far from the middle of the bed; in between the straight line holds. */
const offCentre = (maxForce: number, points: readonly (readonly [number, number])[] | undefined) => (points === undefined ? "the same all along"
  : points.map(([distance, share], index) => <span key={distance}>{index > 0 && ", "}{num(formatForce(maxForce * share))} at {mmOf(distance)}</span>));

/** A brake with everything that the planner knows of it. */
export function MachineCard({ machine: view }: { readonly machine: MachineView }) {
  const read = readMachineDocument(view.document);
  if (!read.ok) return <Notice tone="wrong" title={`${view.name} cannot be read`}>{read.error[0]?.message}</Notice>;
  const machine = read.value;
  const { gauge, settings, times } = machine;
  return (
    <section aria-label={view.name} className="mb-12">
      <h2 className="border-y border-ink py-1.5 text-lg font-semibold">{view.name}</h2>
      <div className="mt-4 grid grid-cols-1 gap-x-10 gap-y-6 md:grid-cols-2 xl:grid-cols-[26rem_1fr_1fr]">
        <MachineDrawing machine={machine} />
        <div>
          <h3 className="caption mb-1">Frame and force</h3>
          <Facts rows={[
            { label: "Bed", value: mmOf(machine.bedLength) }, { label: "Between the frames", value: mmOf(machine.betweenFrames) }, { label: "Throat", value: mmOf(machine.throatDepth) },
            { label: "Most force", value: num(formatForce(machine.maxForce)) }, { label: "Off the middle of the bed", value: offCentre(machine.maxForce, settings.offCentre) }, { label: "Daylight", value: mmOf(machine.daylight) }, { label: "Stroke", value: mmOf(machine.stroke) },
            { label: "Holds punches with tang", value: machine.punchTang }, { label: "Holds dies with tang", value: machine.dieTang },
          ]} />
        </div>
        <div className="space-y-5">
          <div>
            <h3 className="caption mb-1">Back gauge</h3>
            <Facts rows={[
              { label: "Fingers", value: <>{num(String(gauge.fingers))}, {gauge.independent ? "each by itself" : "together"}</> },
              { label: "X, depth", value: range(gauge.x) }, { label: "R, height", value: range(gauge.r) }, { label: "Z, along the bed", value: range(gauge.z) }, { label: "Least spread", value: mmOf(gauge.minSpread) },
            ]} />
          </div>
          <div>
            <h3 className="caption mb-1">Settings and times</h3>
            <Facts rows={[
              { label: "Clearance kept", value: mmOf(settings.clearance) }, { label: "Largest gap between pieces", value: mmOf(settings.maxSectionGap) }, { label: "Largest uncovered end", value: mmOf(settings.maxUncoveredEnd) },
              { label: "Gauge stop repeats within", value: <>±{mmOf(settings.gaugeRepeat)}</> }, { label: "Angle repeats within", value: num(`±${formatNumber(toDeg(settings.angleRepeat), 2)}°`) },
              { label: "Flip, turn", value: <>{seconds(times.flip)}, {seconds(times.turn)}</> }, { label: "Stroke, gauge move", value: <>{seconds(times.stroke)}, {seconds(times.gaugeMove)}</> },
              { label: "Walk", value: seconds(times.walkPerMetre, "s/m") }, { label: "Set up a station, place a piece", value: <>{seconds(times.stationSetup)}, {seconds(times.sectionPlace)}</> },
            ]} />
          </div>
        </div>
      </div>
    </section>
  );
}
