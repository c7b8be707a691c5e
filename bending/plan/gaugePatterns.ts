import { hitSides } from "../clearance/hitSides";
import { machineFrames } from "../clearance/machineFrames";
import { MEANT_CONTACT_MM } from "../core/tolerance";
import { rad } from "../core/units";
import type { Frame } from "../geometry/frame";
import { invertFrame } from "../geometry/invertFrame";
import { bendFrame } from "../part/bendFrame";
import { foldContact } from "../setup/foldContact";
import { edgeContacts, SQUARE_SINE, type Contact } from "../setup/edgeContacts";
import { uprightContact } from "../setup/uprightContact";
import type { Situation } from "./situation";

/** Where fingers may touch the sheet in every state that agrees with `value` on `mask`; `contact` null: it was not looked where. */
export interface GaugePattern {
  readonly mask: number;
  readonly value: number;
  readonly contact: Contact | null;
}

type GaugeQuestion = Pick<Situation, "part" | "machine" | "moves" | "pairs">;

/** One more step from face to face. */
interface Joint { readonly bend: number; readonly to: number; readonly flat: Float64Array; readonly formed: Float64Array }

/** Answers, for a move, every place behind the die that a finger could touch in some state, whatever may be in its way. */
export function gaugePatterns(situation: GaugeQuestion, deepest: number): (move: number) => readonly GaugePattern[] {
  const { part, machine: { gauge }, moves, pairs } = situation;
  const height = Math.max(0, ...gauge.fingerProfile.filter((p) => Math.abs(p[0]) < MEANT_CONTACT_MM).map((p) => p[1]));
  const joints = jointsOf(situation);
  const slanted = gauge.independent && gauge.fingers > 1;
  const touch = (face: number, frame: Frame): readonly Contact[] => {
    const upright = uprightContact(part, face, frame, height);
    const found = [...edgeContacts(part, face, frame, slanted), ...(upright ? [upright] : [])];
    return found.map((contact) => ({ ...contact, x: contact.x + (Math.abs(contact.slope) * gauge.fingerWidth) / 2 })).filter((contact) => inTravel(contact, situation));
  };
  return (move) => {
    const { bends, front, mask: own } = moves[move] ?? { bends: [], front: 0, mask: 0 };
    const pair = pairs[0];
    if (pair === undefined) return [];
    const hit = { bends, front, formed: 0 };
    const inFront = hitSides(part, hit);
    const start = machineFrames(part, hit, rad(0), pair.punch, pair.die);
    const found: GaugePattern[] = [];
    const frames = Array.from({ length: deepest + 2 }, () => new Float64Array(12));
    const visit = (face: number, from: number, mask: number, value: number, depth: number): void => {
      const at = frames[depth] as Float64Array;
      if (Math.hypot(at[6] as number, at[8] as number) <= SQUARE_SINE || Math.hypot(at[7] as number, at[8] as number) <= SQUARE_SINE) {
        for (const contact of touch(face, frameOf(at))) found.push({ mask, value, contact });
      }
      for (const { bend, to, flat, formed } of joints[face] ?? []) {
        if ((own >> bend) & 1) continue;
        const bit = 1 << bend;
        // The fold of a hem that lies on this face, also when the way came in over it.
        if (part.bends[bend]?.hem && to === part.bends[bend].child && (bend !== from || (value & bit) !== 0)) {
          const fold = foldContact(part, bend, frameOf(at));
          if (fold && inTravel(fold, situation)) found.push({ mask: mask | bit, value: value | bit, contact: fold });
        }
        if (bend === from) continue;
        if (depth === deepest) { found.push({ mask, value, contact: null }); return; }
        compose(at, flat, frames[depth + 1] as Float64Array);
        visit(to, bend, mask | (1 << bend), value, depth + 1);
        compose(at, formed, frames[depth + 1] as Float64Array);
        visit(to, bend, mask | (1 << bend), value | (1 << bend), depth + 1);
      }
    };
    for (const index of bends) {
      const bend = part.bends[index];
      for (const wing of bend ? [bend.parent, bend.child] : []) {
        const frame = start[wing];
        if (inFront[wing] || frame === undefined) continue;
        frames[0]?.set([...frame.x, ...frame.y, ...frame.z, ...frame.o]);
        visit(wing, -1, 0, 0, 0);
      }
    }
    return found;
  };
}

/** mm. Over rounding noise of frames put together in another order, far under the gauge's own step. */
const NOISE_MM = 1e-6;

/** Of a slanted edge some stretch is enough. */
function inTravel(contact: Contact, { machine: { gauge: { x, r } } }: GaugeQuestion): boolean {
  const ends = contact.z.map((z) => contact.x + contact.slope * z);
  return Math.max(...ends) >= x[0] - NOISE_MM && Math.min(...ends) <= x[1] + NOISE_MM
    && contact.r >= r[0] - MEANT_CONTACT_MM - NOISE_MM && contact.r <= r[1] + MEANT_CONTACT_MM + NOISE_MM;
}

function jointsOf({ part }: GaugeQuestion): readonly (readonly Joint[])[] {
  const joints: Joint[][] = part.faces.map(() => []);
  part.bends.forEach((bend, index) => {
    const [flat, formed] = [bendFrame(part, bend, 0), bendFrame(part, bend, bend.angle)];
    joints[bend.parent]?.push({ bend: index, to: bend.child, flat: numbersOf(flat), formed: numbersOf(formed) });
    joints[bend.child]?.push({ bend: index, to: bend.parent, flat: numbersOf(invertFrame(flat)), formed: numbersOf(invertFrame(formed)) });
  });
  return joints;
}

const numbersOf = ({ x, y, z, o }: Frame) => Float64Array.from([...x, ...y, ...z, ...o]);

const frameOf = (n: Float64Array): Frame => {
  const at = (i: number) => n[i] as number;
  return { x: [at(0), at(1), at(2)], y: [at(3), at(4), at(5)], z: [at(6), at(7), at(8)], o: [at(9), at(10), at(11)] };
};

/** `composeFrames` on plain columns of numbers: a state is a step of one multiplication. */
function compose(outer: Float64Array, inner: Float64Array, out: Float64Array): void {
  for (let column = 0; column < 12; column += 3) {
    const [a, b, c] = [inner[column] as number, inner[column + 1] as number, inner[column + 2] as number];
    for (let i = 0; i < 3; i += 1) {
      out[column + i] = (outer[i] as number) * a + (outer[3 + i] as number) * b + (outer[6 + i] as number) * c + (column === 9 ? (outer[9 + i] as number) : 0);
    }
  }
}
