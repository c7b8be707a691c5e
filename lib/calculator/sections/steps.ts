import { deg, mm, toDeg, toRad } from "@/bending/core/units";
import { radiusBySteps } from "@/bending/handbook/radiusBySteps";
import { resolveAllowance } from "@/bending/handbook/resolveAllowance";
import { figures } from "../figures";
import type { Section } from "../section";

/** A large radius made of many small bends. */
export const steps: Section = {
  id: "steps", title: "Radius by steps", question: "How many hits make a large radius, and how far apart?", fields: ["sr", "sa", "ss"], choices: [], needs: ["t"],
  answer: (q) => {
    const [insideRadius, angle, wish] = [mm(q.number("sr")), toRad(deg(q.number("sa"))), toRad(deg(q.number("ss")))];
    const { k } = resolveAllowance({ material: q.material, thickness: q.thickness, insideRadius, angle: toRad(deg(90)) });
    const made = radiusBySteps(angle, insideRadius, q.thickness, k, { angle: wish });
    const [R, t, K, α, n] = [figures.length(insideRadius), figures.length(q.thickness), figures.ratio(k), figures.angle(q.number("sa")), figures.count(made.hits)];
    const source = "MetalForming Magazine";
    return [{
      answers: [
        { label: "Hits", kind: "count", value: made.hits, source: `angle in all over the angle of one hit, made whole upwards; ${source}` },
        { label: "Angle of each hit", kind: "angle", value: toDeg(made.anglePerHit), formula: { text: "β = [α | n]", of: { α, n } }, source: `${source}; about 2° leaves a face that looks smooth` },
        { label: "Distance of two hits on the flat", kind: "length", value: made.pitch, formula: { text: "p = [π | 180°] · [α | n] · (R + K · t)", of: { α, n, R, K, t } }, source: `along the neutral line; K by the material's rule; ${source}` },
        { label: "Length of the whole arc in the flat", kind: "length", value: made.neutralArc, formula: { text: "BA = [π | 180°] · α · (R + K · t)", of: { α, R, K, t } }, source: "bend allowance" },
        { label: "Arc along the inside", kind: "length", value: made.insideArc, formula: { text: "l_i = [π | 180°] · α · R", of: { α, R } }, source },
        { label: "Facets stand inside the true arc by", kind: "length", value: made.facetHeight, formula: { text: "h = R · (1 − cos([β | 2]))", of: { R, β: figures.angle(toDeg(made.anglePerHit)) } }, source: "geometry" },
        { label: "V of about twice the distance", kind: "length", value: made.vOpening, formula: { text: "V = 2 · p", of: { p: figures.length(made.pitch) } }, source },
      ],
    }];
  },
};
