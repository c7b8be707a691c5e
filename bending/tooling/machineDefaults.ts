/** What holds when a machine document leaves settings or times out, in mm, degrees and seconds: common practice, no source. */
export const machineDefaults = {
  settings: { clearance: 1, maxSectionGap: 5, maxUncoveredEnd: 5, angleRepeat: 0.3, gaugeRepeat: 0.1 },
  times: { flip: 4, turn: 3, walkPerMetre: 2, stroke: 4, gaugeMove: 1.5, stationSetup: 60, sectionPlace: 8 },
} as const;
