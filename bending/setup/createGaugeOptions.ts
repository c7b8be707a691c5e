import { facesOf } from "../clearance/facesOf";
import type { Halves } from "../clearance/createAsks";
import type { FaceState, Half, HalfState } from "../clearance/half";
import { MEANT_CONTACT_MM } from "../core/tolerance";
import type { Frame } from "../geometry/frame";
import type { PartModel } from "../part/partModel";
import type { BackGauge } from "../tooling/machine";
import { edgeContacts, type Contact } from "./edgeContacts";
import { fingerHeight } from "./fingerHeight";
import { foldContact } from "./foldContact";
import { createFingerRoom } from "./createFingerRoom";
import type { GaugeOption } from "./gaugeOption";
import { joinContacts } from "./joinContacts";
import { uprightContact } from "./uprightContact";

/** Every way to locate the sheet before a stroke, the two halves of it as they stand. */
export type GaugeOptions = (halves: Halves, formed: number) => readonly GaugeOption[];

/**
 * Every way to locate the sheet before a stroke, best first: two fingers before one, a straight edge or an
 * upright flange before a slanted edge, the nearest to the bend line first (least error adds up).
 * Before the stroke the sheet lies level on the die. What a face offers is worked out once for each of its states, and
 * everything once for each state of the half behind the die, and of the faces in front that reach over it.
 */
export function createGaugeOptions(part: PartModel, gauge: BackGauge): GaugeOptions {
  const known = new Map<FaceState, readonly Contact[]>();
  const room = createFingerRoom(part, gauge);
  const height = fingerHeight(gauge);
  const contactsOf = ({ bend }: Half, face: FaceState): readonly Contact[] => {
    const found = known.get(face);
    if (found) return found;
    const frame = beforeStroke(face.frame(), bend.allowance);
    const upright = uprightContact(part, face.path.face, frame, height);
    const fold = foldOf(face);
    const made = [...edgeContacts(part, face.path.face, frame, gauge.independent && gauge.fingers > 1), ...(upright ? [upright] : []), ...(fold ? [{ ...fold, x: fold.x + bend.allowance / 2 }] : [])]
      .map((contact) => ({ ...contact, x: contact.x + (Math.abs(contact.slope) * gauge.fingerWidth) / 2 }))
      .flatMap((contact) => withinTravel(contact, gauge));
    known.set(face, made);
    return made;
  };
  /** The fold of a hem that the face hangs on; the hem's frame is its parent's. */
  const foldOf = (face: FaceState): Contact | null => {
    const index = face.path.bends[face.path.bends.length - 1];
    const hem = index === undefined ? undefined : part.bends[index];
    if (index === undefined || !hem?.hem || !((face.state >> index) & 1)) return null;
    return foldContact(part, index, hem.child === face.path.face && face.before ? face.before.frame() : face.frame());
  };
  const find = (half: Half, back: HalfState, over: readonly FaceState[]): readonly GaugeOption[] => {
    const contacts = facesOf(back).flatMap((face) => contactsOf(half, face)).sort((p, q) => p.face - q.face);
    if (contacts.length === 0) return [];
    return joinContacts(contacts)
      .map((contact): GaugeOption => ({ ...settingOf(contact), free: room(half, back, contact, over) }))
      .filter((option) => option.free.length > 0)
      .sort((a, b) => rank(a, gauge) - rank(b, gauge) || nearest(a) - nearest(b) || a.face - b.face || a.edge - b.edge);
  };
  const overOf = new Map<HalfState, { readonly faces: readonly FaceState[]; readonly key: string }>();
  /** Faces of the half in front that reach over the bend line. */
  const reachingOver = ({ bend }: Half, front: HalfState) => {
    const known = overOf.get(front);
    if (known) return known;
    const faces = facesOf(front).filter((face) => face.bounds().a[0] + bend.allowance / 2 < 0);
    const made = { faces, key: faces.map(({ index }) => index).join() };
    overOf.set(front, made);
    return made;
  };
  const answers = new Map<HalfState, Map<string, readonly GaugeOption[]>>();
  return ({ front, back }, formed) => {
    const behind = back.at(formed);
    const { faces, key } = reachingOver(front, front.at(formed));
    const known = answers.get(behind) ?? new Map<string, readonly GaugeOption[]>();
    answers.set(behind, known);
    const answer = known.get(key) ?? find(back, behind, faces);
    known.set(key, answer);
    return answer;
  };
}

/** A wing's coordinates are the machine's before the stroke, but for a counted from the tangent and x from the bend line. */
function beforeStroke({ x, y, z, o }: Frame, allowance: number): Frame {
  return { x, y, z, o: [o[0] + allowance / 2, o[1], o[2]] };
}

const settingOf = ({ x, slope, r, on, face, edge }: Contact): Omit<GaugeOption, "free"> => ({ x, slope, r, on, face, edge });

const rank = (option: GaugeOption, gauge: BackGauge) => {
  const [first, last] = [option.free[0], option.free[option.free.length - 1]];
  const two = gauge.fingers > 1 && first && last && last[1] - first[0] >= gauge.minSpread;
  return (two ? 0 : 2) + (option.slope === 0 ? 0 : 1);
};

const nearest = (option: GaugeOption) => Math.min(...option.free.map(([z]) => option.x + option.slope * z));

/** The contact as far as X and R reach it: of a slanted edge the stretch that is within X. */
function withinTravel(contact: Contact, { x, r }: BackGauge): readonly Contact[] {
  if (contact.r < r[0] - MEANT_CONTACT_MM || contact.r > r[1] + MEANT_CONTACT_MM) return [];
  if (contact.slope === 0) return contact.x >= x[0] && contact.x <= x[1] ? [contact] : [];
  const [one, other] = x.map((at) => (at - contact.x) / contact.slope);
  const z = [Math.max(contact.z[0], Math.min(one ?? 0, other ?? 0)), Math.min(contact.z[1], Math.max(one ?? 0, other ?? 0))] as const;
  return z[0] < z[1] ? [{ ...contact, z }] : [];
}
