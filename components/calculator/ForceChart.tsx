import { mm, type LengthUnit } from "@/bending/core/units";
import { airBendForces } from "@/bending/handbook/airBendForces";
import { forceCurves } from "@/lib/calculator/forceCurves";
import type { Question } from "@/lib/calculator/question";
import { dieLimits, type ForceLimit } from "@/lib/calculator/shopLimits";
import { formatQuantity, quantityScale, quantityUnit } from "@/lib/format/formatQuantity";
import { ChartKey } from "./chart/ChartKey";
import { ChartLimit } from "./chart/ChartLimit";
import { ChartLine, dashes } from "./chart/ChartLine";
import { ChartMark } from "./chart/ChartMark";
import { ChartSheet } from "./chart/ChartSheet";
import { ChartTable } from "./chart/ChartTable";
import { chartFrame } from "./chart/chartFrame";
import { LimitNotes } from "./LimitNotes";
import type { ShopLimits } from "./useShopLimits";

/** Room over the highest force of the curves, so that limits a little above still show. */
const ROOM = 1.2;
const strokes = ["var(--steel-600)", "var(--steel-600)", "var(--accent)"];

/** Force against V by the published forms, with what the brakes give and the tools bear. */
export function ForceChart({ question, limits }: { readonly question: Question; readonly limits: ShopLimits }) {
  const { thickness, tensile, vOpening, choices: { u: units }, number } = question;
  const length = number("l");
  const curves = forceCurves(question);
  const highest = Math.max(...curves.flatMap(({ points }) => points.map(([, force]) => force)));
  const all = curves[0]?.points ?? [];
  const span: readonly [number, number] = [all[0]?.[0] ?? 0, all.at(-1)?.[0] ?? 1];
  const needs = (v: number) => (Math.max(...airBendForces(tensile, thickness, mm(v)).forms.map(({ perMetre }) => perMetre as number)) * length) / 1000;
  const dies = dieLimits(limits.dies, length, span, needs);
  const brakes: readonly ForceLimit[] = limits.machines.map(({ name, maxForceKN }) => ({ name, most: maxForceKN }));
  const punches: readonly ForceLimit[] = limits.punches.map(({ code, maxForcePerMetreKN }) => ({ name: code, most: (maxForcePerMetreKN * length) / 1000 }));
  const weakest = punches.reduce<ForceLimit | null>((low, one) => (low === null || one.most < low.most ? one : low), null);
  const lines = [...brakes, ...(weakest === null ? [] : [{ name: `punch ${weakest.name}, the least rated`, most: weakest.most }])];
  const [perMm, perKN] = [quantityScale("length", units), quantityScale("force", units)];
  const frame = chartFrame([span[0] * perMm, span[1] * perMm], [0, highest * ROOM * perKN]);
  const drawn = (v: number, force: number) => [v * perMm, force * perKN] as const;
  const here = needs(vOpening);
  const said = (force: number) => formatQuantity(force, "force", units);
  return (
    <div>
      <ChartSheet title="Force against V opening" note={`${question.material.id}, ${formatQuantity(thickness, "length", units)}, ${formatQuantity(length, "length", units)} of bend`} frame={frame}
        xLabel={`V opening, ${quantityUnit("length", units)}`} yLabel={`Force, ${quantityUnit("force", units)}`}
        description={`Force falls from ${said(highest)} at a V of ${formatQuantity(span[0], "length", units)} to ${said(needs(span[1]))} at ${formatQuantity(span[1], "length", units)}; ${said(here)} at ${formatQuantity(vOpening, "length", units)} by the highest form. The table below has the numbers.`}>
        {lines.filter(({ most }) => most <= highest * ROOM).map((limit) => <ChartLimit key={limit.name} frame={frame} y={limit.most * perKN} label={`${limit.name}: ${said(limit.most)}`} />)}
        {curves.map(({ name, points }, i) => <ChartLine key={name} frame={frame} points={points.map(([v, force]) => drawn(v, force))} dash={dashes[i] ?? ""} stroke={strokes[i] ?? ""} />)}
        {dies.filter(({ bears }) => bears <= highest * ROOM).map((die) => <ChartMark key={die.name} frame={frame} at={drawn(die.vOpening, die.bears)} label={die.name} shape={die.bears < die.needs ? "cross" : "square"} ink={die.bears < die.needs ? "var(--brick-ink)" : "var(--ink)"} side={die.vOpening > (span[0] + span[1]) / 2 ? "left" : "right"} />)}
        <ChartMark frame={frame} at={drawn(vOpening, here)} label={`V ${formatQuantity(vOpening, "length", units)}: ${said(here)}`} shape="ring" side={vOpening > (span[0] + span[1]) / 2 ? "left" : "right"} />
        <ChartKey frame={frame} lines={curves.map(({ name }, i) => ({ name, dash: dashes[i] ?? "", stroke: strokes[i] ?? "" }))} />
      </ChartSheet>
      <LimitNotes brakes={brakes} punches={punches} dies={dies} needed={here} units={units} more={limits.more} />
      <ChartTable name="Force against V opening" heads={["V opening", ...curves.map(({ name }) => name)]} rows={tableRows(curves, units)} />
    </div>
  );
}

/** Every fourth point of the curves. */
const tableRows = (curves: ReturnType<typeof forceCurves>, units: LengthUnit) => (curves[0]?.points ?? []).flatMap(([v], i) => (i % 4 === 0 ? [[formatQuantity(v, "length", units), ...curves.map(({ points }) => formatQuantity(points[i]?.[1] ?? NaN, "force", units))]] : []));
