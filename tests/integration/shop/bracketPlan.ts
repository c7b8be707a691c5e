import type { PlanDocument } from "@/bending/plan/planDocument";

/** A plan of the bracket worked out by hand: one stroke, one station in the middle of the bed. */
export const bracketPlan: PlanDocument = {
  format: "plan/1", engine: "by hand", units: "mm", part: "Bracket", machine: "Test brake", batch: 20, status: "optimal", gap: 0,
  flat: {
    width: 96.52, depth: 150, area: 14478, massKg: 0.227,
    bends: [{ id: "b1", allowance: 4.524, deduction: 3.476, k: 0.44, insideRadius: 2, source: "K-factor" }],
  },
  flatLength: 96.52,
  steps: [{
    bends: ["b1"], front: "b1", punch: "P-1", die: "V-16", station: "A", bendZ: [-75, 75], angle: 90, demandedAngle: 90.8, insideRadius: 2,
    forceKN: 28, depthMm: 6.1, toolWindow: [-500, 500],
    gauge: { x: 38.3, r: 0, fingers: [{ x: 38.3, r: 0, z: -50 }, { x: 38.3, r: 0, z: 50 }], face: "base", edge: 3 },
    handling: { flip: false, turn: 0 },
  }],
  order: ["b1"],
  stations: [{
    id: "A", punch: "P-1", die: "V-16", from: -100, to: 100,
    punchSections: [{ length: 200, piece: "P-1-200-1" }], dieSections: [{ length: 200, piece: "V-16-200-1" }],
  }],
  seconds: { setup: 136, perPart: 12, total: 376 },
  cost: 376,
  proof: { method: "by hand", expanded: 1, bound: 376 },
  reasons: [],
  cautions: [],
  elapsedMs: 0,
};
