import { deg, mm, toRad } from "@/bending/core/units";
import type { DieEntry } from "@/bending/tooling/toolingDocument";
import { hemDieProfile } from "@/bending/tooling/hemDieProfile";
import { vDieProfile } from "@/bending/tooling/vDieProfile";
import { drawer } from "./drawer";
import { roundedProfile } from "./roundedProfile";
import type { SectionSet } from "./sectionSets";
import { sectionsOf } from "./sectionsOf";

/** V opening, angle in degrees, shoulder radius, width of the body, height, rating in kN/m, pieces. */
const rows: readonly (readonly [number, number, number, number, number, number, SectionSet])[] = [
  [6, 88, 0.4, 18, 60, 350, "short"],
  [8, 88, 0.6, 20, 60, 500, "bed"],
  [10, 88, 0.8, 22, 60, 600, "long"],
  [12, 88, 1, 24, 60, 700, "bed"],
  [16, 88, 1.5, 28, 60, 900, "bed"],
  [20, 88, 2, 34, 60, 1000, "long"],
  [24, 88, 2.5, 40, 60, 1000, "split"],
  [32, 88, 3, 50, 80, 1000, "long"],
  [40, 88, 4, 60, 80, 1000, "pair"],
  [50, 88, 5, 74, 80, 1200, "pair"],
  [63, 88, 6, 92, 80, 1200, "long"],
  [6, 85, 0.4, 18, 60, 350, "pair"],
  [8, 85, 0.6, 20, 60, 450, "split"],
  [10, 85, 0.8, 22, 60, 550, "pair"],
  [12, 85, 1, 24, 60, 650, "split"],
  [16, 85, 1.5, 28, 60, 800, "split"],
  [20, 85, 2, 34, 60, 900, "pair"],
  [24, 85, 2.5, 40, 60, 1000, "pair"],
  [8, 60, 0.6, 22, 60, 400, "short"],
  [12, 60, 1, 26, 60, 550, "pair"],
  [16, 60, 1.5, 30, 60, 700, "pair"],
  [24, 60, 2.5, 42, 80, 800, "pair"],
  [6, 30, 0.4, 22, 60, 300, "short"],
  [8, 30, 0.6, 24, 60, 400, "split"],
  [10, 30, 0.8, 26, 60, 450, "pair"],
  [12, 30, 1, 28, 60, 500, "short"],
  [16, 30, 1.5, 34, 80, 600, "pair"],
  [24, 30, 2.5, 46, 100, 700, "pair"],
  [8, 88, 0.6, 14, 80, 300, "split"],
  [12, 88, 1, 18, 80, 450, "short"],
  [8, 85, 0.6, 14, 80, 300, "short"],
];

/** Bodies of less than this over the opening are the narrow ones, for returns close to the bend. */
const NARROW = 8;

const slot = { floor: 44, back: 6, opening: 20 };

/** Bends a hem acutely in its V and flattens it in the slot underneath, which stands open on springs. */
const hemDie: DieEntry = {
  id: "H8-26-H90", kind: "die", vOpening: 8, vAngle: 26, shoulderRadius: 0.8, height: 90, maxForcePerMetre: 600,
  name: "Two-stage hem die V 8, 26°",
  tang: "60 mm",
  profile: roundedProfile(hemDieProfile({ vOpening: mm(8), vAngle: toRad(deg(26)), shoulderRadius: mm(0.8), height: mm(90), bodyWidth: mm(50) },
    { floor: mm(slot.floor), back: mm(slot.back), opening: mm(slot.opening) })),
  sections: sectionsOf("H8-26-H90", "short", drawer("F", rows.length)),
  flattening: slot,
};

export const dies: readonly DieEntry[] = [...rows.map(([vOpening, vAngle, shoulderRadius, width, height, maxForcePerMetre, set], index): DieEntry => {
  const narrow = width - vOpening < NARROW;
  const id = `V${vOpening}-${vAngle}-H${height}${narrow ? "-narrow" : ""}`;
  const shape = { vOpening: mm(vOpening), vAngle: toRad(deg(vAngle)), shoulderRadius: mm(shoulderRadius), height: mm(height), bodyWidth: mm(width) };
  return {
    id, kind: "die", vOpening, vAngle, shoulderRadius, height, maxForcePerMetre,
    name: `${narrow ? "Narrow die" : "Die"} V ${vOpening}, ${vAngle}°`,
    tang: "60 mm",
    profile: roundedProfile(vDieProfile(shape)),
    sections: sectionsOf(id, set, drawer("F", index)),
  };
}), hemDie];
