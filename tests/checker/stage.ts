import type { Die, Interval, Punch, Tool } from "@/bending";
import { bodiesOf, type Body, type Halves } from "./bodies";
import type { Modeller } from "./modeller";
import { carry, motionOf, type HalfMotion, type Motion } from "./motion";
import { hitBend, placePart } from "./placePart";
import { stripOf } from "./rolled";
import type { Scene, Stroke } from "./scene";
import { createToolShapes, type Thing, type ToolShape } from "./toolBars";
import { openingOf, type Rest } from "./wayContact";
import { zoneInMaking, type Zone } from "./zoneContact";

/** A scene with everything in its place. */
export interface Stage {
  readonly motion: Motion;
  readonly halves: Halves;
  readonly ram: Thing;
  readonly bed: Thing;
  thing(tool: Tool, at: Interval): Thing;
  /** The bend lines of the stroke, and the whole part, along the bed. */
  readonly line: Interval;
  readonly extent: Interval;
  restAt(moment: number): Rest;
  zoneAt(moment: number): Zone;
}

const LONG = 5000;

/** What all states of a stroke share. */
interface Stroked {
  readonly motion: Motion;
  readonly zones: Map<number, Zone>;
}

export function createStages(modeller: Modeller): (scene: Scene) => Stage | null {
  const shapes = createToolShapes(modeller);
  const stroked = new WeakMap<Stroke, { readonly made: Stroked | null }>();
  return (scene) => {
    const { made } = stroked.get(scene.stroke) ?? { made: strokedOf(scene) };
    stroked.set(scene.stroke, { made });
    return made ? stageOf(scene, made, shapes, modeller) : null;
  };
}

/** Moments in which nothing of the part, folded or flat, goes farther than a quarter of the margin. Null when the die does not fit the bend. */
function strokedOf({ part, hit, die, machine, demanded }: Scene): Stroked | null {
  const { across: [nx, ny], begin } = stripOf(hitBend(part, hit));
  const reach = Math.max(...part.faces.flatMap(({ outline }) => outline.map(([x, y]) => Math.abs(nx * x + ny * y - begin))));
  const moments = Math.min(4000, Math.max(40, Math.ceil(((reach + die.vOpening) * demanded) / 2 / (machine.settings.clearance / 4))));
  const motion = motionOf(part, hit, die, demanded, moments);
  return motion && { motion, zones: new Map() };
}

function stageOf(scene: Scene, { motion, zones }: Stroked, shapes: (profile: Tool["profile"]) => ToolShape, modeller: Modeller): Stage | null {
  const { part, hit, punch, die, machine, demanded } = scene;
  const last = placePart(part, hit, die, demanded);
  if (!last) return null;
  const halves = bodiesOf(part, hit, last.faces, (ring, by) => modeller.grown(ring, -by));
  const all = [...halves.front, ...halves.back];
  const zoneAt = (moment: number) => {
    const found = zones.get(moment) ?? zoneInMaking(part, hit, die, motion.angles[moment] ?? 0);
    zones.set(moment, found);
    return found;
  };
  const rests = new Map<number, Rest>();
  return {
    motion, halves, zoneAt,
    ram: { name: "ram", shape: shapes(machine.ramProfile), onRam: true, lift: punch.height, from: -LONG, to: LONG },
    bed: { name: "bed", shape: shapes(machine.bedProfile), onRam: false, lift: -die.height, from: -LONG, to: LONG },
    thing: (tool, at) => thingOf(tool, at, punch, die, shapes),
    line: lineOf(scene, last.faces[hitBend(part, hit).parent] ?? []),
    extent: [Math.min(...all.map(({ z }) => z[0])), Math.max(...all.map(({ z }) => z[1]))],
    restAt: (moment) => {
      const tip = motion.tips[moment] ?? 0;
      const found = rests.get(moment) ?? {
        bodies: [...halves.front.map((body) => moved(body, motion.front, moment)), ...halves.back.map((body) => moved(body, motion.back, moment))],
        zone: zoneAt(moment),
        tip, opening: openingOf(machine, punch.height + die.height, tip), depth: part.thickness - tip,
      };
      rests.set(moment, found);
      return found;
    },
  };
}

/** Punches hang at one seat, dies stand on one. */
function thingOf(tool: Tool, [from, to]: Interval, punch: Punch, die: Die, shapes: (profile: Tool["profile"]) => ToolShape): Thing {
  const onRam = tool.kind === "punch";
  return { name: tool.id, shape: shapes(tool.profile), onRam, lift: onRam ? punch.height - tool.height : tool.height - die.height, from, to };
}

function moved(body: Body, half: HalfMotion, moment: number): Body {
  const carried = (points: Float64Array) => {
    const into = new Float64Array(points.length);
    carry(points, half, moment, into);
    return into;
  };
  let parts: readonly Float64Array[] | null | undefined;
  return { ...body, hull: carried(body.hull), parts: () => (parts === undefined ? (parts = body.parts()?.map(carried) ?? null) : parts), core: () => body.core().map(carried) };
}

function lineOf({ part, hit }: Scene, parent: readonly number[]): Interval {
  const { along } = stripOf(hitBend(part, hit));
  const sign = (parent[8] ?? 0) * along[0] + (parent[9] ?? 0) * along[1];
  const ends = hit.bends.flatMap((i) => (part.bends[i]?.line ?? []).map(([x, y]) => sign * (along[0] * x + along[1] * y) + (parent[11] ?? 0)));
  return [Math.min(...ends), Math.max(...ends)];
}
