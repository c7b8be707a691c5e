import { kiloNewton, kiloNewtonPerMetre, mm, mpa } from "@/bending";
import { FORCE_V_RANGE } from "@/bending/handbook/airBendForce";
import { bendingWork, WORK_FILL } from "@/bending/handbook/bendingWork";
import { chartForce, type chartForces } from "@/bending/handbook/chartForce";
import { forceForms, SHORT_TON_PER_FOOT } from "@/bending/handbook/forceForms";
import { methodForceRange, type ForceRange } from "@/bending/handbook/methodForceRange";
import { materialMultiplier, publishedMultipliers } from "@/bending/handbook/materialMultiplier";
import { publishedForce } from "@/bending/handbook/publishedForce";
import { defaultMethodFactors, publishedMethodFactors, type BendMethod } from "@/bending/handbook/forceMethods";
import type { CorpusFormulas } from "./handbookCase";

export const handbookForceFormulas: CorpusFormulas = {
  /** Force on `width` in the units of the strength and the lengths, or tons a foot when the case says inches and tons. */
  publishedForce: (i) => {
    const form = forceForms.find(({ id }) => id === i.form);
    if (!form) return NaN;
    const scale = i.tons === true ? 25.4 : 1;
    const tensile = i.tensile === "base" ? form.base ?? mpa(NaN) : mpa(Number(i.tensile));
    const perLength = publishedForce(form, tensile, mm(Number(i.thickness) * scale), mm(Number(i.opening) * scale));
    return (perLength * Number(i.width)) / (i.tons === true ? SHORT_TON_PER_FOOT : 1);
  },
  forceFactor: (i) => {
    const form = forceForms.find(({ id }) => id === i.form);
    return form ? form.factor + form.perRatio / Number(i.openingOverThickness) : NaN;
  },
  /** V over thickness between which Oehler's form holds. */
  forceRange: (i) => FORCE_V_RANGE[i.end === "highest" ? 1 : 0],
  /** One source's factor over air bending or over bottoming. */
  publishedMethodFactor: (i) => {
    const entry = publishedMethodFactors.find(({ method, over, source }) => method === i.method && over === i.over && source.startsWith(String(i.source)));
    return entry?.factor[i.end === "highest" ? 1 : 0] ?? NaN;
  },
  defaultMethodFactor: (i) => defaultMethodFactors[i.method as BendMethod],
  methodForceRange: (i) => methodForceRange(kiloNewtonPerMetre(1), i.method as BendMethod)[i.end as keyof ForceRange],
  chartForce: (i) => chartForce(i.shape as keyof typeof chartForces, i.method as "air" | "bottoming", mm(25.4))[i.end as keyof ForceRange] / SHORT_TON_PER_FOOT,
  bendingWork: (i) => bendingWork(kiloNewton(Number(i.force)), mm(Number(i.travel)), Number(i.fill)),
  workFill: (i) => WORK_FILL[i.end === "highest" ? 1 : 0],
  materialMultiplier: (i) => materialMultiplier(mpa(Number(i.tensile)), mpa(Number(i.base))),
  publishedMultiplier: (i) => publishedMultipliers.find(({ material, chart }) => material === i.material && chart.startsWith(String(i.chart)))?.factor ?? NaN,
};
