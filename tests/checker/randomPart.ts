import { buildPart, materialById, readPartDocument, type FlangeEntry, type PartDocument, type PartModel } from "@/bending";
import type { Random } from "./random";

const MATERIALS = ["S235", "1.4301", "AW-5754-H22"];

type Way = "up" | "down";

const common = (random: Random) => {
  const thickness = random.pick([0.5, 0.8, 1, 1, 1.5, 1.5, 2, 2, 3, 4, 6]);
  return { format: "part/1", units: "mm", material: random.pick(MATERIALS), thickness, insideRadius: random.pick([0.6, 1, 1.3, 2]) * thickness } as const;
};

const angle = (random: Random) => (random.chance(0.7) ? 90 : random.whole(30, 150));
const way = (random: Random, up = 0.6): Way => (random.chance(up) ? "up" : "down");

/** Shortest leg that its bends leave room for, roughly. */
const leastLeg = (thickness: number) => 4 + 7 * thickness;

/** Chains of 2 to 7 legs. */
function profile(random: Random): PartDocument {
  const facts = common(random);
  const leg = () => Math.round(leastLeg(facts.thickness) + random.number(0, 1) ** 2 * random.pick([30, 80, 220]));
  const count = random.pick([2, 3, 3, 4, 4, 4, 5, 6, 7]);
  const up = random.pick([0.5, 0.5, 0.8, 1]);
  return {
    ...facts, name: "chain",
    profile: { width: random.whole(20, 500), legs: Array.from({ length: count }, leg), bends: Array.from({ length: count - 1 }, () => ({ angle: angle(random), direction: way(random, up) })) },
  };
}

function hung(random: Random, id: string, thickness: number, deep: number): readonly FlangeEntry[] {
  if (deep === 0 || random.chance(0.45)) return [];
  const inset = random.pick([0, 0, 2, 8]);
  const on: FlangeEntry = {
    id: `${id}b`, on: id, edge: 2, length: Math.round(leastLeg(thickness) + random.number(0, 30)), angle: angle(random), direction: way(random, 0.7),
    start: inset, end: random.chance(0.7) ? inset : inset + 6,
    ...(random.chance(0.25) ? { startAngle: random.whole(5, 40), endAngle: random.whole(5, 40) } : {}),
  };
  return [on, ...hung(random, on.id, thickness, deep - 1)];
}

function flange(random: Random, id: string, edge: number, thickness: number, up: number): readonly FlangeEntry[] {
  const inset = random.pick([0, 0, 0, 3, 12]);
  const length = Math.round(leastLeg(thickness) + random.number(0, 1) ** 2 * 110);
  const first: FlangeEntry = {
    id, on: "base", edge, length, angle: angle(random), direction: way(random, up), start: inset, end: inset,
    ...(random.chance(0.2) ? { startAngle: random.whole(5, 30), endAngle: random.whole(5, 30) } : {}),
    ...(random.chance(0.15) ? { holes: [{ circle: [random.whole(20, 50), Math.max(8, length / 2)], diameter: 8 }] } : {}),
  };
  return [first, ...hung(random, id, thickness, 2)];
}

const edges = (random: Random) => ({
  ...(random.chance(0.4) ? { corner: random.chance(0.3) ? { kind: "open" as const } : { kind: "mitre" as const, gap: random.pick([0.3, 1, 3]) } } : {}),
  ...(random.chance(0.5) ? { relief: random.pick([{ kind: "rectangular" as const }, { kind: "tear" as const }, { kind: "round" as const }]) } : {}),
});

/** Rectangles with flanges on most sides, windows, and returns on the flanges. */
function tray(random: Random): PartDocument {
  const facts = common(random);
  const [width, depth] = [random.whole(60, 320), random.whole(60, 320)];
  const up = random.pick([0.5, 0.85, 1]);
  return {
    ...facts, ...edges(random), name: "tray",
    base: {
      outline: [[0, 0], [width, 0], [width, depth], [0, depth]],
      ...(random.chance(0.4) ? { holes: [{ polygon: [[width * 0.3, depth * 0.3], [width * 0.7, depth * 0.3], [width * 0.7, depth * 0.7], [width * 0.3, depth * 0.7]] }] } : {}),
    },
    flanges: [0, 1, 2, 3].flatMap((edge) => (random.chance(0.75) ? flange(random, `side${edge}`, edge, facts.thickness, up) : [])),
  };
}

/** Polygons of five to seven edges with flanges on some of them. */
function polygon(random: Random): PartDocument {
  const facts = common(random);
  const [corners, turn, radius] = [random.whole(3, 7), random.number(0, 360), random.whole(100, 180)];
  const up = random.pick([0.6, 1]);
  return {
    ...facts, ...edges(random), name: "polygon",
    base: { outline: Array.from({ length: corners }, (_, i) => {
      const a = ((turn + (360 * i) / corners) * Math.PI) / 180;
      return [radius * Math.cos(a), radius * Math.sin(a)] as const;
    }) },
    flanges: Array.from({ length: corners }, (_, edge) => edge).flatMap((edge) => (random.chance(0.6) ? flange(random, `side${edge}`, edge, facts.thickness, up) : [])),
  };
}

/** A sheet with two or three tabs on one line, formed by one stroke or one by one, and walls. */
function tabs(random: Random): PartDocument {
  const facts = common(random);
  const [width, depth] = [random.whole(160, 360), random.whole(70, 200)];
  const [a, b] = [random.whole(30, 60), random.whole(30, 60)];
  const same = { angle: angle(random), direction: way(random), relief: { kind: random.pick(["rectangular", "tear"] as const) } };
  const length = () => Math.round(leastLeg(facts.thickness) + random.number(0, 60));
  return {
    ...facts, name: "tabs",
    base: { outline: [[0, 0], [width, 0], [width, depth], [0, depth]] },
    flanges: [
      { id: "left", on: "base", edge: 0, length: length(), start: 10, end: width - 10 - a, ...same },
      { id: "right", on: "base", edge: 0, length: length(), start: width - 10 - b, end: 10, ...same },
      ...[1, 2, 3].flatMap((edge) => (random.chance(0.6) ? flange(random, `side${edge}`, edge, facts.thickness, 0.7) : [])),
    ],
  };
}

export interface RandomPart {
  readonly document: PartDocument;
  readonly part: PartModel;
}

/** Parts of all kinds of the shop, the same for the same draws; what cannot be built is drawn again. */
export function randomPart(random: Random): RandomPart {
  for (;;) {
    const document = random.pick([profile, profile, tray, tray, polygon, tabs])(random);
    const read = readPartDocument(JSON.parse(JSON.stringify(document)));
    const part = read.ok ? buildPart(read.value, { materials: materialById }) : read;
    if (part.ok && part.value.bends.length > 0 && part.value.bends.length <= 30) return { document, part: part.value };
  }
}
