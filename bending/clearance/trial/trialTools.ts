import { deg, kiloNewton, kiloNewtonPerMetre, mm, rad, toRad } from "../../core/units";
import { relievedPunchProfile } from "../../tooling/relievedPunchProfile";
import { straightPunchProfile } from "../../tooling/straightPunchProfile";
import type { Machine } from "../../tooling/machine";
import type { Die, Punch } from "../../tooling/tool";
import { vDieProfile } from "../../tooling/vDieProfile";

const common = { maxForcePerMetre: kiloNewtonPerMetre(1000), tang: "20 mm", pieces: [] };

export function straightPunch(id: string, tip = 88, height = 120, bodyWidth = 26): Punch {
  const shape = { tipAngle: toRad(deg(tip)), tipRadius: mm(0.8), height: mm(height), bodyWidth: mm(bodyWidth) };
  return { ...common, ...shape, id, name: id, kind: "punch", profile: straightPunchProfile(shape) };
}

export function relievedPunch(id: string, side: "front" | "back", height = 150): Punch {
  const shape = { tipAngle: toRad(deg(85)), tipRadius: mm(0.8), height: mm(height), bodyWidth: mm(26), reliefDepth: mm(14), reliefHeight: mm(90), side };
  return { ...common, ...shape, id, name: id, kind: "punch", profile: relievedPunchProfile(shape) };
}

export function vDie(id: string, vOpening = 16, height = 60, bodyWidth = 40, vAngle = 85): Die {
  const shape = { vOpening: mm(vOpening), vAngle: toRad(deg(vAngle)), shoulderRadius: mm(1.5), height: mm(height), bodyWidth: mm(bodyWidth) };
  return { ...common, ...shape, id, name: id, kind: "die", profile: vDieProfile(shape) };
}

export const trialMachine: Machine = {
  name: "Trial brake",
  bedLength: mm(3000), betweenFrames: mm(2600), maxForce: kiloNewton(1200), daylight: mm(520), stroke: mm(250), throatDepth: mm(400),
  punchTang: "20 mm", dieTang: "20 mm",
  ramProfile: [[-40, 0], [60, 0], [60, 700], [-40, 700]],
  bedProfile: [[-45, -700], [60, -700], [60, 0], [-45, 0]],
  gauge: {
    fingers: 2, independent: true, x: [mm(8), mm(800)], r: [mm(-30), mm(200)], z: [mm(-1500), mm(1500)], minSpread: mm(60),
    fingerProfile: [[0, -20], [50, -20], [50, 0], [0, 0]], fingerWidth: mm(40),
  },
  settings: { clearance: mm(1), maxSectionGap: mm(5), maxUncoveredEnd: mm(5), angleRepeat: rad(0.005), gaugeRepeat: mm(0.1) },
  times: { flip: 4, turn: 3, walkPerMetre: 2, stroke: 4, gaugeMove: 1.5, stationSetup: 60, sectionPlace: 8 },
};
