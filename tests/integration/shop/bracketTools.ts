import { deg, kiloNewtonPerMetre, mm, toRad } from "@/bending/core/units";
import type { Die, Punch } from "@/bending/tooling/tool";

/** A straight punch and a V die with a few pieces: enough for an L bracket. */
export const bracketPunch: Punch = {
  id: "P-1", kind: "punch", name: "Straight punch",
  profile: [[0, 0], [8, 8.3], [8, 100], [-8, 100], [-8, 8.3]],
  tipAngle: toRad(deg(88)), tipRadius: mm(0.8), height: mm(100), maxForcePerMetre: kiloNewtonPerMetre(800), tang: "20 mm",
  pieces: [
    { id: "P-1-200-1", length: mm(200), horn: null, rack: "A1" },
    { id: "P-1-100-1", length: mm(100), horn: "left", rack: "A2" },
  ],
};

export const bracketDie: Die = {
  id: "V-16", kind: "die", name: "V die 16",
  profile: [[-20, 0], [-20, -60], [20, -60], [20, 0], [8, 0], [0, -8.6], [-8, 0]],
  vOpening: mm(16), vAngle: toRad(deg(86)), shoulderRadius: mm(1), height: mm(60), maxForcePerMetre: kiloNewtonPerMetre(1000), tang: "60 mm",
  pieces: [{ id: "V-16-200-1", length: mm(200), horn: null, rack: "B1" }],
};
