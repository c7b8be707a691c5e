import fc from "fast-check";
import Module, { type CrossSection, type Manifold, type ManifoldToplevel } from "manifold-3d";
import { beforeAll, expect, test } from "vitest";
import { MEANT_CONTACT_MM } from "@/bending/core/tolerance";
import { selfMeetings } from "@/bending/findings/selfMeetings";
import { foldFrames } from "@/bending/part/foldFrames";
import type { PartModel } from "@/bending/part/partModel";
import type { PartDocument } from "@/bending/part/partDocument";
import { buildPart } from "@/bending/part/buildPart";
import { materialById } from "@/bending/handbook/materials";
import { arbitraryProfile, arbitraryTray } from "./arbitraryPart";

let wasm: ManifoldToplevel;
beforeAll(async () => {
  wasm = await Module();
  wasm.setup();
});

/** The faces of the finished part as a general modeller's solids, each shrunk by `off` on all sides (round the outline and in thickness). */
function plates(part: PartModel, off: number): readonly (Manifold | null)[] {
  const frames = foldFrames(part, part.bends.map(({ angle }) => angle));
  return part.faces.map((face, i) => {
    const frame = frames[i];
    const rings = [face.outline, ...face.holes].map((ring) => ring.map(([x, y]): [number, number] => [x, y]));
    const whole: CrossSection = new wasm.CrossSection(rings, "EvenOdd");
    const section = off === 0 ? whole : whole.offset(-off, "Miter", 2);
    if (!frame || section.isEmpty()) return null;
    const { x, y, z, o } = frame;
    return wasm.Manifold.extrude(section, part.thickness - 2 * off).translate([0, 0, off]).transform([...x, 0, ...y, 0, ...z, 0, ...o, 1]);
  });
}

/** Pairs of faces whose solids share room. */
function sharing(solids: readonly (Manifold | null)[], least: number): ReadonlySet<string> {
  const found = new Set<string>();
  solids.forEach((a, i) => solids.slice(i + 1).forEach((b, k) => {
    if (!a || !b) return;
    const both = a.intersect(b);
    if (both.volume() > least) found.add(`${i} ${i + 1 + k}`);
    both.delete();
  }));
  return found;
}

function facePairs(part: PartModel): ReadonlySet<string> {
  return new Set(selfMeetings(part).flatMap(({ one, other }) => (one.of === "face" && other.of === "face" ? [[one.index, other.index].sort((a, b) => a - b).join(" ")] : [])));
}

/** Short middle legs and steep angles, so that parts run into themselves. */
const crowded = fc.tuple(fc.oneof(arbitraryProfile, arbitraryTray), fc.constantFrom(1, 0.5)).map(([document, share]): PartDocument =>
  (document.profile ? { ...document, profile: { ...document.profile, legs: document.profile.legs.map((leg, i) => (i % 2 === 1 ? Math.max(14, Math.round(leg * share)) : leg)) } } : document));

test("faces of a folded part meet where a solid modeller says so, but for the tolerance", { timeout: 300_000 }, () => {
  let [met, clear] = [0, 0];
  fc.assert(fc.property(crowded, (document) => {
    const built = buildPart(document, { materials: materialById });
    if (!built.ok) return;
    const said = facePairs(built.value);
    const [shrunk, whole] = [plates(built.value, MEANT_CONTACT_MM), plates(built.value, 0)];
    const [surely, atAll] = [sharing(shrunk, 1e-6), sharing(whole, 0)];
    for (const solid of [...shrunk, ...whole]) solid?.delete();
    for (const pair of surely) expect(said, `missed ${pair}`).toContain(pair);
    for (const pair of said) expect(atAll, `said ${pair}`).toContain(pair);
    if (said.size > 0) met += 1;
    else clear += 1;
  }), { numRuns: 70, seed: 7 });
  expect(Math.min(met, clear)).toBeGreaterThanOrEqual(10);
});
