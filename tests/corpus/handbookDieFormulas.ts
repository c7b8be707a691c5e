import { deg, materialById, mm, mpa, toDeg, toRad } from "@/bending";
import { bendUnderLoad } from "@/bending/handbook/bendUnderLoad";
import type { DieOpening } from "@/bending/handbook/dieOpening";
import { flangeAtContact } from "@/bending/handbook/flangeAtContact";
import { flangeWithMargin } from "@/bending/handbook/flangeWithMargin";
import { legToOutermostTangent } from "@/bending/handbook/legToOutermostTangent";
import { punchTravel } from "@/bending/handbook/punchTravel";
import { springback } from "@/bending/handbook/springback";
import { springbackFactor, type SpringbackMaterial } from "@/bending/handbook/springbackFactor";
import type { CorpusFormulas, CaseInput } from "./handbookCase";

export const handbookDieFormulas: CorpusFormulas = {
  flangeAtContact: (i) => flangeAtContact(turned(i), dieOf(i)),
  flangeWithMargin: (i) => flangeWithMargin(turned(i), dieOf(i)).advised,
  punchTravel: (i) => punchTravel(turned(i), mm(Number(i.radius)), mm(Number(i.thickness)), dieOf(i)),
  /** Travel for one degree more or less about an angle. */
  travelPerDegree: (i) => {
    const travel = (included: number) => punchTravel(turned({ included }), mm(Number(i.radius)), mm(Number(i.thickness)), dieOf(i));
    return travel(Number(i.included) - 0.5) - travel(Number(i.included) + 0.5);
  },
  legToOutermostTangent: (i) => legToOutermostTangent(mm(Number(i.apexLeg)), turned(i), mm(Number(i.radius)), mm(Number(i.thickness))),
  springbackFactor: (i) => springbackFactor(i.material as SpringbackMaterial, Number(i.ratio))?.factor ?? NaN,
  /** What the planner takes a bend to so that it springs back to the wanted one, by elastic recovery. */
  demandedBend: (i) => {
    const base = materialById("S235");
    if (!base) return NaN;
    const material = { ...base, yield: mpa(Number(i.yield)), modulus: mpa(Number(i.modulus)), springbackRow: null };
    const made = springback(toRad(deg(Number(i.angle))), mm(Number(i.radius)), mm(Number(i.thickness)), material);
    return i.result === "angle" ? toDeg(made.angle) : made.radius;
  },
  bendUnderLoad: (i) => {
    const made = bendUnderLoad({ angle: toRad(deg(Number(i.angle))), radius: mm(Number(i.radius)) }, mm(Number(i.thickness)), Number(i.factor));
    return i.result === "angle" ? toDeg(made.angle) : made.radius;
  },
};

const turned = (i: CaseInput) => toRad(deg(180 - Number(i.included)));

/** A case that gives the die's angle has its V between the sharp corners. */
function dieOf(i: CaseInput): DieOpening {
  const shared = { opening: mm(Number(i.vOpening)), shoulderRadius: mm(Number(i.shoulderRadius)) };
  return i.dieAngle === undefined
    ? { measured: "between-tops", ...shared }
    : { measured: "between-corners", ...shared, dieAngle: toRad(deg(Number(i.dieAngle))) };
}
