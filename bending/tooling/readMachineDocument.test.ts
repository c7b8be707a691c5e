import { describe, expect, it } from "vitest";
import { readMachineDocument } from "./readMachineDocument";

const document = {
  format: "machine/1", name: "Brake 1", units: "mm", bedLength: 3100, betweenFrames: 2600, maxForce: 1350, daylight: 520, stroke: 250, throatDepth: 410,
  punchTang: "20 mm", dieTang: "60 mm",
  ramProfile: [[-30, 0], [50, 0], [50, 600], [-30, 600]], bedProfile: [[-30, -700], [50, -700], [50, 0], [-30, 0]],
  gauge: { fingers: 2, independent: true, x: [8, 800], r: [-30, 200], z: [-1500, 1500], minSpread: 60, fingerProfile: [[0, -20], [60, -20], [60, 0], [0, 0]], fingerWidth: 40 },
};
const problems = (json: unknown) => {
  const result = readMachineDocument(json);
  return result.ok ? [] : result.error.map(({ path, message }) => `${path}: ${message}`);
};

describe("readMachineDocument", () => {
  it("fills settings and times in", () => {
    const result = readMachineDocument({ ...document, settings: { clearance: 2 }, times: { flip: 9 } });
    expect(result.ok && result.value.settings).toMatchObject({ clearance: 2, maxSectionGap: 5, maxUncoveredEnd: 5, gaugeRepeat: 0.1 });
    expect(result.ok && result.value.settings.angleRepeat).toBeCloseTo((0.3 * Math.PI) / 180, 12);
    expect(result.ok && result.value.times).toEqual({ flip: 9, turn: 3, walkPerMetre: 2, stroke: 4, gaugeMove: 1.5, stationSetup: 60, sectionPlace: 8 });
  });

  it("reads inches, the defaults staying millimetres", () => {
    const result = readMachineDocument({ ...document, units: "in", bedLength: 120, betweenFrames: 100, settings: { maxSectionGap: 0.25 } });
    expect(result.ok && result.value.bedLength).toBeCloseTo(3048, 9);
    expect(result.ok && result.value.settings).toMatchObject({ clearance: 1, maxSectionGap: 6.35 });
  });

  it.each([
    ["ram upside down", { ...document, ramProfile: [[-30, 0], [50, 0], [50, -600], [-30, -600]] }, /^ramProfile: the punch's seat must be at y = 0 with the ram above it/],
    ["bed upside down", { ...document, bedProfile: [[-30, 0], [50, 0], [50, 700], [-30, 700]] }, /^bedProfile: the die's seat must be at y = 0/],
    ["finger off", { ...document, gauge: { ...document.gauge, fingerProfile: [[5, -20], [60, -20], [60, 0], [5, 0]] } }, /^gauge\.fingerProfile: the stop face must be at x = 0/],
    ["crossing ram", { ...document, ramProfile: [[-30, 0], [50, 0], [-30, 600], [50, 600]] }, /^ramProfile: crosses itself: edge 1 and edge 3/],
    ["range turned about", { ...document, gauge: { ...document.gauge, x: [800, 8] } }, /^gauge\.x: must go from the lower to the higher/],
    ["no force", { ...document, maxForce: undefined }, /^maxForce: is missing; give the greatest force in kN/],
    ["unknown time", { ...document, times: { coffee: 300 } }, /^times\.coffee: "coffee" is not a field here/],
    ["negative clearance", { ...document, settings: { clearance: -1 } }, /^settings\.clearance: must be over 0/],
  ])("explains: %s", (_, json, message) => {
    expect(problems(json)).toEqual([expect.stringMatching(message)]);
  });

  it("explains what is no document at all", () => {
    for (const json of [null, 3, "x", []]) expect(problems(json).length).toBeGreaterThan(0);
  });
});
