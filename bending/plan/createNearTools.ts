import { convexPieces } from "../geometry/convexPieces";
import type { Vec2 } from "../geometry/vec2";
import type { Contact } from "../setup/edgeContacts";
import type { Situation } from "./situation";

/** A rectangle round something: x from and to, y from and to. */
type Box = readonly [number, number, number, number];

/** With more pairs than this a finger near any tool is taken to meet one with some and none with others. */
const PAIRS_ASKED = 16;

/** Answers whether a finger at a contact may meet the tools of some pairs and not those of others: then they do not gauge alike. */
export function createNearTools({ pairs, machine, part, fingers: against }: Situation): (contact: Contact) => boolean {
  const { gauge } = machine;
  const punches = new Map(pairs.map(({ punch }) => [punch.id, punch]));
  const dies = new Map(pairs.map(({ die }) => [die.id, die]));
  const bodies: readonly Box[] = [
    ...[...punches.values()].flatMap((punch) => [boxOf(punch.profile, part.thickness), boxOf(machine.ramProfile, part.thickness + punch.height)]),
    ...[...dies.values()].flatMap((die) => [boxOf(die.profile, 0), boxOf(machine.bedProfile, -die.height)]),
  ];
  const fingers = convexPieces(gauge.fingerProfile).map((piece) => boxOf(piece, 0));
  const known = new Map<string, boolean>();
  return ({ x, slope, r, z }) => {
    const nearest = x + Math.min(slope * z[0], slope * z[1]);
    const near = fingers.some(([x0, , y0, y1]) => bodies.some((body) => nearest + x0 < body[1] && r + y0 < body[3] && r + y1 > body[2]));
    if (!near || slope !== 0 || pairs.length > PAIRS_ASKED) return near;
    const key = `${x.toFixed(3)}/${r.toFixed(3)}`;
    const answer = known.get(key) ?? pairs.some(({ punch, die }) => against.pair(x, r, part.thickness, punch, die));
    known.set(key, answer);
    return answer;
  };
}

function boxOf(profile: readonly Vec2[], lift: number): Box {
  const [xs, ys] = [profile.map((p) => p[0]), profile.map((p) => p[1] + lift)];
  return [Math.min(...xs), Math.max(...xs), Math.min(...ys), Math.max(...ys)];
}
