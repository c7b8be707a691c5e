import type { Interval } from "@/bending";
import { gaugeOptions } from "@/bending/setup/gaugeOptions";
import { fingerMeetsTools } from "@/bending/setup/fingerMeetsTools";
import { bodyDistance, convexDistance } from "./convexDistance";
import { SHAVED_MM } from "./limits";
import type { Random } from "./random";
import type { Scene } from "./scene";
import type { Stage } from "./stage";
import type { Finding, Outcome } from "./tally";
import { boxesMeet, boxInto, boxToBar, type Box } from "./boxes";
import { barsOf, boxOfBar, type ToolShape } from "./toolBars";

const LONG = 5000;

const box: Box = new Float64Array(6);
const fingerBox: Box = new Float64Array(6);

/** One place that the product offers to a gauge finger: is it clear of the flat part on the die, of the tools, ram and bed? Null when it offers none. */
export function judgeFinger(scene: Scene, stage: Stage, random: Random, fingerShape: ToolShape): { readonly outcome: Outcome; readonly finding: Finding | null } | null {
  const { part, hit, machine, punch, die } = scene;
  const offered = gaugeOptions(part, hit, machine).filter((option) => {
    const ends = [option.free[0]?.[0] ?? 0, option.free[option.free.length - 1]?.[1] ?? 0];
    return !ends.some((z) => fingerMeetsTools(option.x + option.slope * z, option.r, part.thickness, punch, die, machine));
  });
  if (offered.length === 0) return null;
  const option = random.pick(offered);
  const [from, to] = random.pick(option.free);
  const z = random.pick([from, to, random.number(from, to)]);
  const half = machine.gauge.fingerWidth / 2 - SHAVED_MM;
  const [x, r] = [option.x + option.slope * z, option.r];
  const fingers = fingerShape.shaved.map((profile) => prism(profile, x, r, [z - half, z + half]));
  const rest = stage.restAt(0);
  const finding = (what: string): Finding => ({ question: "finger", outcome: "falseFeasible", say: `finger at x ${x.toFixed(3)}, r ${r.toFixed(3)}, z ${z.toFixed(3)} (${option.on}, slope ${option.slope.toFixed(3)}) meets ${what}`, angle: 0 });
  const met = (finger: Float64Array, points: Float64Array): boolean => {
    boxInto(points, box);
    return boxesMeet(box, fingerBox) && bodyDistance(finger, points, 0.01) <= 0;
  };
  for (const finger of fingers) {
    boxInto(finger, fingerBox);
    const body = rest.bodies.find((one) => met(finger, one.hull) && (one.parts() ?? [one.hull]).some((points) => met(finger, points)));
    if (body) return { outcome: "falseFeasible", finding: finding(body.name) };
    if (rest.zone.slices.some((slice) => met(finger, slice))) return { outcome: "falseFeasible", finding: finding("the zone in the making") };
    for (const thing of [stage.thing(punch, [-LONG, LONG]), stage.thing(die, [-LONG, LONG]), stage.ram, stage.bed]) {
      if (barsOf(thing, true, 0, thing.onRam ? rest.tip : 0).some((bar) => boxToBar(fingerBox, 0, boxOfBar(bar), bar.from, bar.to) <= 0 && convexDistance(finger, 0, bar, 0.01) <= 0)) return { outcome: "falseFeasible", finding: finding(thing.name) };
    }
  }
  return { outcome: "clear", finding: null };
}

function prism(profile: Float64Array, x: number, y: number, ends: Interval): Float64Array {
  const points: number[] = [];
  for (const z of ends) for (let i = 0; i < profile.length; i += 2) points.push((profile[i] as number) + x, (profile[i + 1] as number) + y, z);
  return Float64Array.from(points);
}
