/** The two brakes of the invented shop, as `machine/1` documents; makes and models are made up. */

/** Clamp and ram beam: y = 0 at the punch's seat. */
const ramProfile = (clamp: number, beam: number, height: number) => [
  [-clamp, 0], [clamp, 0], [clamp, 80], [beam, 95], [beam, height], [-beam, height], [-beam, 95], [-clamp, 80],
];

/** Die rail and bed beam: y = 0 at the die's seat. */
const bedProfile = (rail: number, beam: number, depth: number) => [
  [rail, 0], [-rail, 0], [-rail, -60], [-beam, -75], [-beam, -depth], [beam, -depth], [beam, -75], [rail, -60],
];

/** A slender nose that reaches over a die, its lower side level with the die's top; the carriage behind. */
const fingerProfile = [[0, 0], [70, 0], [85, -30], [220, -30], [220, 45], [70, 45], [14, 18], [0, 18]];

export const largeBrake = {
  format: "machine/1",
  name: "Brake 1 · Tarrowby 135/3100",
  units: "mm",
  bedLength: 3100,
  betweenFrames: 2600,
  maxForce: 1350,
  daylight: 520,
  stroke: 250,
  throatDepth: 410,
  punchTang: "20 mm",
  dieTang: "60 mm",
  ramProfile: ramProfile(28, 45, 900),
  bedProfile: bedProfile(30, 50, 800),
  gauge: {
    fingers: 2, independent: true, x: [8, 800], r: [-30, 200], z: [-1500, 1500], minSpread: 60,
    fingerProfile, fingerWidth: 40,
  },
  settings: { clearance: 1, maxSectionGap: 5, maxUncoveredEnd: 5, angleRepeat: 0.3, gaugeRepeat: 0.1, offCentre: [[400, 1], [1550, 0.5]] },
  times: { flip: 4, turn: 3, walkPerMetre: 2, stroke: 4, gaugeMove: 1.5, stationSetup: 60, sectionPlace: 8 },
} as const;

export const smallBrake = {
  format: "machine/1",
  name: "Brake 2 · Quillside 40/1250",
  units: "mm",
  bedLength: 1250,
  betweenFrames: 1050,
  maxForce: 400,
  daylight: 400,
  stroke: 150,
  throatDepth: 200,
  punchTang: "20 mm",
  dieTang: "60 mm",
  ramProfile: ramProfile(26, 32, 600),
  bedProfile: bedProfile(30, 36, 600),
  gauge: {
    fingers: 2, independent: false, x: [6, 500], r: [-20, 120], z: [-600, 600], minSpread: 50,
    fingerProfile, fingerWidth: 30,
  },
  settings: { clearance: 1, maxSectionGap: 5, maxUncoveredEnd: 5, angleRepeat: 0.4, gaugeRepeat: 0.15 },
  times: { flip: 3, turn: 2, walkPerMetre: 2, stroke: 3, gaugeMove: 1, stationSetup: 45, sectionPlace: 6 },
} as const;

export const machines = [largeBrake, smallBrake];
