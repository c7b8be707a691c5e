import { mm } from "@/bending/core/units";
import { bendToHemDistance } from "@/bending/handbook/bendToHemDistance";
import { hemDeduction } from "@/bending/handbook/hemDeduction";
import { hemSteps } from "@/bending/handbook/hemSteps";
import { bendFigures } from "../bendFigures";
import { figures } from "../figures";
import type { Section } from "../section";

/** How a hem is made and what it takes. */
export const hem: Section = {
  id: "hem", title: "Hem", question: "How is a hem made, and what does it take of the flat?", fields: ["hg"], choices: [], needs: ["t", "v", "r"],
  answer: (q) => {
    const steps = hemSteps(q.thickness);
    const { R, t } = bendFigures(q);
    const gap = mm(q.number("hg"));
    const r_h = figures.length(gap / 2);
    return [{
      answers: [
        { label: "First hit: angle left open", kind: "angle", value: steps.preBendOpening[0], upTo: steps.preBendOpening[1], source: "stamping and press-brake guides; 45° works sometimes" },
        { label: "First hit: turned through", kind: "angle", value: steps.preBendTurned[0], upTo: steps.preBendTurned[1], source: "180° less the angle left open; the second hit flattens" },
        { label: "Shortest return", kind: "length", value: steps.returnLength, formula: { text: "l = 4 · t", of: { t } }, source: "closed or open hem; from memory" },
        { label: "Deduction of the hem, K = 0.5", kind: "length", value: hemDeduction(q.thickness, gap), formula: { text: "BD = 2 · (r_h + t) − π · (r_h + [t | 2])", of: { r_h, t } }, source: "lengths to the outermost tangent; closed hem 0.43 t in shop practice, from memory" },
        { label: "Bend to hem, at least", kind: "length", value: bendToHemDistance(q.thickness, q.insideRadius, mm(gap / 2)), formula: { text: "d = 5 · t + R + r_h", of: { t, R, r_h } }, source: "one design guide; weak" },
      ],
      remark: steps.suitsTwoStageDie
        ? { tone: "note", text: "A two-stage hem die suits this thickness. Flattening pushes sideways on the tools: mind their rating." }
        : { tone: "caution", text: "Over 2 mm (14 gauge) a two-stage hem die is seldom rated for it, and flattening pushes sideways on the tools." },
    }];
  },
};
