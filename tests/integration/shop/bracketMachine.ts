import type { MachineDocument } from "@/bending/tooling/machineDocument";

export const bracketMachine: MachineDocument = {
  format: "machine/1", name: "Test brake", units: "mm", bedLength: 1250, betweenFrames: 1050, maxForce: 400, daylight: 400, stroke: 150,
  throatDepth: 250, punchTang: "20 mm", dieTang: "60 mm",
  ramProfile: [[-30, 0], [30, 0], [30, 200], [-30, 200]],
  bedProfile: [[-40, 0], [-40, -300], [40, -300], [40, 0]],
  gauge: { fingers: 2, independent: false, x: [5, 500], r: [-20, 100], z: [-500, 500], minSpread: 60, fingerProfile: [[0, 0], [60, 0], [60, 30], [0, 30]], fingerWidth: 40 },
};
