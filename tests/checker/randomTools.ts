import { deg, kiloNewtonPerMetre, mm, readMachineDocument, readToolingDocument, toRad, type Die, type Machine, type Punch } from "@/bending";
import { relievedPunchProfile } from "@/bending/tooling/relievedPunchProfile";
import { straightPunchProfile } from "@/bending/tooling/straightPunchProfile";
import { vDieProfile } from "@/bending/tooling/vDieProfile";
import { machines } from "@/seeds/shop/machines";
import { tooling } from "@/seeds/shop/tools";
import type { Random } from "./random";

function must<T>(read: { readonly ok: true; readonly value: T } | { readonly ok: false; readonly error: unknown }): T {
  if (!read.ok) throw new Error(JSON.stringify(read.error));
  return read.value;
}

const library = must(readToolingDocument(JSON.parse(JSON.stringify(tooling))));
const brakes = machines.map((document) => must(readMachineDocument(JSON.parse(JSON.stringify(document)))));
const libraryPunches = library.filter((tool): tool is Punch => tool.kind === "punch");
const libraryDies = library.filter((tool): tool is Die => tool.kind === "die");
const common = { maxForcePerMetre: kiloNewtonPerMetre(1000), tang: "20 mm", pieces: [] };

/** A punch of the demonstration library, or one that is made up. */
export function randomPunch(random: Random, sharpest: number): Punch {
  if (random.chance(0.5)) return random.pick(libraryPunches);
  const angle = random.chance(0.8) && sharpest >= 80 ? random.pick([80, 85, 88]) : random.whole(28, 88);
  const shape = { tipAngle: toRad(deg(angle)), tipRadius: mm(random.pick([0.5, 0.8, 1, 2])), height: mm(random.whole(70, 220)), bodyWidth: mm(random.whole(8, 40)) };
  const id = `punch-${random.whole(0, 1e9)}`;
  if (angle < 80 || random.chance(0.4)) return { ...common, ...shape, id, name: id, kind: "punch", profile: straightPunchProfile(shape) };
  const relief = {
    reliefDepth: mm(random.whole(1, 18)), reliefHeight: mm(Math.round(shape.height * random.number(0.4, 0.7))), noseWidth: mm(random.whole(6, 9)), neckWidth: mm(random.whole(8, 18)),
    side: random.pick(["front", "back"] as const),
  };
  return { ...common, ...shape, id, name: id, kind: "punch", profile: relievedPunchProfile({ ...shape, ...relief }) };
}

/** A die whose V suits the thickness, of the library or made up. */
export function randomDie(random: Random, thickness: number): Die {
  const [low, high] = [4.5 * thickness, 14 * thickness];
  const suiting = libraryDies.filter(({ vOpening }) => vOpening >= low && vOpening <= high);
  if (suiting.length > 0 && random.chance(0.6)) return random.pick(suiting);
  const vOpening = Math.round(10 * random.number(low, high)) / 10;
  const vAngle = random.pick([30, 60, 75, 80, 85, 85, 88, 88]);
  const radius = Math.round(100 * vOpening * random.number(0.05, 0.12)) / 100;
  const shape = {
    vOpening: mm(vOpening), vAngle: toRad(deg(vAngle)), shoulderRadius: mm(radius),
    height: mm(Math.round(vOpening / (2 * Math.tan(toRad(deg(vAngle)) / 2)) + random.number(15, 70))), bodyWidth: mm(Math.round(vOpening + 2 * radius + random.pick([2, 6, 12, 30]))),
  };
  const id = `die-${random.whole(0, 1e9)}`;
  return { ...common, ...shape, id, name: id, kind: "die", profile: vDieProfile(shape) };
}

/** One of the demonstration shop's brakes, sometimes with less room or another margin. */
export function randomMachine(random: Random): Machine {
  const brake = random.pick([...brakes.slice(0, 1), ...brakes]);
  const clearance = mm(random.pick([1, 1, 1, 0.5, 2]));
  return { ...brake, daylight: mm(brake.daylight - random.pick([0, 0, 40, 100])), settings: { ...brake.settings, clearance } };
}
