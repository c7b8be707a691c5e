import { depthCurves } from "@/lib/calculator/depthCurves";
import type { Question } from "@/lib/calculator/question";
import { formatQuantity, quantityScale, quantityUnit } from "@/lib/format/formatQuantity";
import { ChartKey } from "./chart/ChartKey";
import { ChartLine, dashes } from "./chart/ChartLine";
import { ChartMark } from "./chart/ChartMark";
import { ChartSheet } from "./chart/ChartSheet";
import { ChartTable } from "./chart/ChartTable";
import { chartFrame } from "./chart/chartFrame";

const strokes = ["var(--accent)", "var(--steel-600)"];

/** Punch depth against the angle for both ways of naming the V, the demanded angle marked. */
export function DepthChart({ question }: { readonly question: Question }) {
  const found = depthCurves(question);
  if (found === null) return null;
  const { curves, aimed, demanded } = found;
  const units = question.choices.u;
  const per = quantityScale("length", units);
  const most = Math.max(...curves.flatMap(({ points }) => points.map(([, travel]) => travel)));
  if (!(most > 0)) return null;
  const frame = chartFrame([0, curves[0]?.points.at(-1)?.[0] ?? 90], [0, most * 1.12 * per]);
  const drawn = ([angle, travel]: readonly [number, number]) => [angle, travel * per] as const;
  const said = ([angle, travel]: readonly [number, number]) => `${formatQuantity(angle, "angle", units)}, ${formatQuantity(travel, "length", units)}`;
  const [, floor] = frame.at([0, 0]);
  const side = aimed[0] > frame.x[1] * 0.42 ? "left" : "right";
  const drop = (point: readonly [number, number], ink: string) => {
    const [x, y] = frame.at(drawn(point));
    return <line x1={x} x2={x} y1={floor} y2={y} stroke={ink} strokeWidth="2" strokeDasharray="4 4" />;
  };
  return (
    <div>
      <ChartSheet title="Punch depth against bend angle" note={`${question.material.id}, V ${formatQuantity(question.vOpening, "length", units)}, radius ${formatQuantity(question.insideRadius, "length", units)}`} frame={frame}
        xLabel="Bend angle, turned through, °" yLabel={`Depth from contact, ${quantityUnit("length", units)}`}
        description={`Depth grows with the angle: ${said(aimed)} without springback; the stroke has to reach ${said(demanded)}. The table below has the numbers.`}>
        {drop(aimed, "var(--ink)")}{drop(demanded, "var(--amber-ink)")}
        {curves.map(({ name, points }, i) => <ChartLine key={name} frame={frame} points={points.filter(([, travel]) => travel >= 0).map(drawn)} dash={dashes[i] ?? ""} stroke={strokes[i] ?? ""} />)}
        <ChartMark frame={frame} at={drawn(aimed)} label={`without springback: ${said(aimed)}`} shape="ring" side={side} labelY={floor - 42} />
        <ChartMark frame={frame} at={drawn(demanded)} label={`demanded: ${said(demanded)}`} shape="square" ink="var(--amber-ink)" side={side} labelY={floor - 16} />
        <ChartKey frame={frame} lines={curves.map(({ name }, i) => ({ name, dash: dashes[i] ?? "", stroke: strokes[i] ?? "" }))} />
      </ChartSheet>
      <ChartTable name="Punch depth against bend angle" heads={["Bend angle", ...curves.map(({ name }) => name)]}
        rows={(curves[0]?.points ?? []).flatMap(([angle], i) => (i > 0 && i % 10 === 0 ? [[formatQuantity(angle, "angle", units), ...curves.map(({ points }) => formatQuantity(points[i]?.[1] ?? NaN, "length", units))]] : []))} />
    </div>
  );
}
