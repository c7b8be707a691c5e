import type { Manifold, Mat4 } from "manifold-3d";
import { BufferAttribute, BufferGeometry, Matrix4 } from "three";
import { MeshBVH } from "three-mesh-bvh";
import { airBend } from "@/bending/clearance/airBend";
import { askHalf, NOTHING } from "@/bending/clearance/askHalf";
import { atRest } from "@/bending/clearance/atRest";
import { createHitPlaces, type HitPlace } from "@/bending/clearance/createHitPlaces";
import { facesOf } from "@/bending/clearance/facesOf";
import type { FaceState, Half } from "@/bending/clearance/half";
import type { Hit } from "@/bending/clearance/hit";
import { machineFrames } from "@/bending/clearance/machineFrames";
import { meetFace } from "@/bending/clearance/meetFace";
import { mirrorShape } from "@/bending/clearance/mirrorShape";
import { placedShape } from "@/bending/clearance/placedShape";
import { punchShape } from "@/bending/clearance/punchShape";
import type { Question } from "@/bending/clearance/question";
import { strokePlacement } from "@/bending/clearance/strokePlacement";
import { createSolids } from "@/bending/clearance/trial/solids";
import { createDice, randomPart } from "@/bending/clearance/trial/trialParts";
import { straightPunch, trialMachine, vDie } from "@/bending/clearance/trial/trialTools";
import { rad, type Rad } from "@/bending/core/units";
import type { Frame } from "@/bending/geometry/frame";
import { identityFrame } from "@/bending/geometry/identityFrame";
import type { PartModel } from "@/bending/part/partModel";
import { partOf } from "./findingParts";
import { corrugated } from "./unfoldQuestions";

/** A face at one moment of a stroke, ready for the clip. */
interface Asked {
  readonly question: Question;
  readonly face: FaceState;
}

/** The same, ready for the other two. */
interface Placed {
  readonly solid: Manifold;
  readonly tree: MeshBVH;
  /** From the unfolded sheet to where the punch's tip is at rest. */
  readonly frame: Mat4;
  readonly toSheet: Matrix4;
}

const punch = straightPunch("P88");
const die = vDie("V16");
const margin = trialMachine.settings.clearance;
const MOMENTS = [0, 0.4, 0.7, 1];

const counts = { clips: 0, entries: 0 };
/** The punch over its tip, which the wings are meant to touch. */
const shape = placedShape(punchShape(punch, margin).filter(({ role }) => role === "body"));
const turned = placedShape(mirrorShape(shape.pieces));

/**
 * Two questions, each asked of the clip, of a solid modeller and of a triangle-mesh library with a tree over either mesh. Each has before
 * what it can use again: the face's plates, solid or tree, the punch, and where the faces stand.
 * "Does this face, placed so, come within the margin of this punch, its tip left out?" over random parts, states and moments, nothing remembered.
 * "Does the part come within the margin of this punch anywhere in the stroke?", what a planner asks, in every state of a part of many
 * bends: the clip starts with nothing and works each path state out once; the other two look at all faces at samples as far apart as the
 * margin allows until one is met, for a few of the states. Answers: how many are met.
 */
export async function clearanceQuestions() {
  const solids = await createSolids();
  const bar = shape.pieces.map(({ corners }) => solids.bar(corners, margin, 0)).reduce((one, other) => one.add(other));
  const barTree = treeOf(bar);
  const bodiesOf = (part: PartModel) => part.faces.map((face) => {
    const solid = solids.plate(face.outline, face.holes, part.thickness, identityFrame);
    return { solid, tree: treeOf(solid) };
  });
  const placesOf = (part: PartModel, bodies: ReturnType<typeof bodiesOf>, hit: Hit, angle: Rad): readonly Placed[] => {
    const bend = part.bends[hit.bends[0] ?? 0];
    const tip = bend ? strokePlacement(bend, part.thickness, die, angle).tipHeight : 0;
    return machineFrames(part, hit, angle, punch, die).flatMap((frame, i): readonly Placed[] => {
      const body = bodies[i];
      const placed = matrix(frame, tip);
      return body ? [{ ...body, frame: placed, toSheet: new Matrix4().fromArray(placed).invert() }] : [];
    });
  };
  const bySolid = (places: readonly Placed[]) => places.filter(({ solid, frame }) => {
    const placed = solid.transform(frame);
    const both = placed.intersect(bar);
    const met = !both.isEmpty();
    both.delete();
    placed.delete();
    return met;
  }).length;
  const byMesh = (places: readonly Placed[]) => places.filter(({ tree, toSheet }) => tree.intersectsGeometry(barTree.geometry, toSheet)).length;

  const single = Array.from({ length: 100 }, (_, seed) => {
    const dice = createDice(seed + 1);
    const part = randomPart(dice);
    const index = Math.floor(dice(0, part.bends.length - 1e-9));
    const hit = { bends: [index], front: part.bends[index]?.parent ?? 0, formed: Math.floor(dice(0, 2 ** part.bends.length)) & ~(1 << index) };
    const asked = MOMENTS.flatMap((share) => askedAt(part, createHitPlaces(part, margin, counts)(hit), hit, share));
    for (const { face } of asked) face.plates();
    const bodies = bodiesOf(part);
    return { asked, places: MOMENTS.flatMap((share) => placesOf(part, bodies, hit, angleAt(part, hit, share))) };
  });
  const asked = single.flatMap((one) => one.asked);
  const places = single.flatMap((one) => one.places);

  const long = partOf(corrugated(LONG));
  const bodies = bodiesOf(long);
  const hits = long.bends.flatMap((bend, index) => Array.from({ length: 2 ** LONG }, (_, formed): Hit => ({ bends: [index], front: bend.parent, formed }))).filter(({ bends, formed }) => !((formed >> (bends[0] ?? 0)) & 1));
  const few = hits.filter((_, i) => i % 2503 === 0).map((hit) => {
    const { front, back } = createHitPlaces(long, margin, counts)(hit);
    const steps = Math.max(...[front, back].flatMap((half) => facesOf(half.at(hit.formed)).map((face) => strokeOf(long, half).steps(face.bounds()))));
    return Array.from({ length: steps + 1 }, (_, k) => placesOf(long, bodies, hit, angleAt(long, hit, k / steps)));
  });
  const strokes = (meets: (places: readonly Placed[]) => number, of: typeof few) => of.filter((moments) => moments.some((moment) => moment.some((place) => meets([place]) > 0))).length;
  return [
    {
      name: "clip faces with a punch", questions: REPEATS * asked.length, clip: () => repeated(() => asked.filter(({ question, face }) => meetFace(question, face).intervals.length > 0).length),
      solids: places.length, solid: () => bySolid(places), meshes: REPEATS * places.length, mesh: () => repeated(() => byMesh(places)),
    },
    {
      name: "clear strokes of a punch", questions: hits.length, clip: () => everyState(long, hits),
      solids: 2, solid: () => strokes(bySolid, few.slice(0, 2)), meshes: few.length, mesh: () => strokes(byMesh, few),
    },
  ];
}

const LONG = 12;
const REPEATS = 20;

function repeated(ask: () => number): number {
  let met = 0;
  for (let i = 0; i < REPEATS; i++) met = ask();
  return met;
}

const angleAt = (part: PartModel, { bends }: Hit, share: number): Rad => rad((part.bends[bends[0] ?? 0]?.angle ?? 0) * share);

function questionsAt(part: PartModel, { front, back }: HitPlace, hit: Hit, share: number): { readonly front: Question; readonly back: Question } {
  const motion = atRest(front.bend, part.thickness, angleAt(part, hit, share));
  const ask = (half: Half, of: typeof shape): Question => ({ index: half.nextQuestion(), shape: of, everywhere: null, lift: 0, onBed: false, motion, margin, counts });
  return { front: ask(front, turned), back: ask(back, shape) };
}

function askedAt(part: PartModel, place: HitPlace, hit: Hit, share: number): readonly Asked[] {
  const questions = questionsAt(part, place, hit, share);
  return (["front", "back"] as const).flatMap((side) => facesOf(place[side].at(hit.formed)).map((face): Asked => ({ question: questions[side], face })));
}

const strokeOf = (part: PartModel, { bend }: Half) => airBend(bend, part.thickness, null, bend.angle, margin);

/** As the planner does it: the halves' states and what was answered of them are kept. */
function everyState(part: PartModel, hits: readonly Hit[]): number {
  const placeOf = createHitPlaces(part, margin, counts);
  const known = new Map<HitPlace, readonly [Question, Question]>();
  return hits.filter((hit) => {
    const place = placeOf(hit);
    const { front, back } = place;
    const ask = (half: Half, of: typeof shape): Question => ({ index: half.nextQuestion(), shape: of, everywhere: null, lift: 0, onBed: false, motion: strokeOf(part, half), margin, counts });
    const questions = known.get(place) ?? [ask(front, turned), ask(back, shape)] as const;
    known.set(place, questions);
    return askHalf(questions[0], front.at(hit.formed)) !== NOTHING || askHalf(questions[1], back.at(hit.formed)) !== NOTHING;
  }).length;
}

function treeOf(solid: Manifold): MeshBVH {
  const { vertProperties, triVerts, numProp } = solid.getMesh();
  const points = new Float32Array((vertProperties.length / numProp) * 3);
  for (let i = 0; i < points.length; i++) points[i] = vertProperties[Math.floor(i / 3) * numProp + (i % 3)] ?? 0;
  const geometry = new BufferGeometry();
  geometry.setAttribute("position", new BufferAttribute(points, 3));
  geometry.setIndex(new BufferAttribute(triVerts, 1));
  const tree = new MeshBVH(geometry);
  geometry.boundsTree = tree;
  return tree;
}

function matrix({ x, y, z, o }: Frame, tipHeight: number): Mat4 {
  return [...x, 0, ...y, 0, ...z, 0, o[0], o[1] - tipHeight, o[2], 1] as Mat4;
}
