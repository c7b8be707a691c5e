import { deg, mm } from "@/bending/core/units";
import { HSE_GUIDE_KG, LOAD_CONSTANT_KG, liftingLimit } from "@/bending/handbook/liftingLimit";
import { onePersonArea } from "@/bending/handbook/onePersonArea";
import { sheetMass } from "@/bending/handbook/sheetMass";
import { figures } from "../figures";
import type { Section } from "../section";

/** What a sheet weighs and who may lift it. */
export const mass: Section = {
  id: "mass", title: "Sheet mass and lifting", question: "What does the sheet weigh, and may one person lift it?", fields: ["w", "d", "ho", "hv", "ht", "ha"], choices: [], needs: ["t"],
  answer: (q) => {
    const { density } = q.material;
    const weight = sheetMass(mm(q.number("w")), mm(q.number("d")), q.thickness, density);
    const { limit, multipliers: { horizontal, vertical, distance, asymmetry } } = liftingLimit({ horizontal: mm(q.number("ho")), height: mm(q.number("hv")), travel: mm(q.number("ht")), asymmetry: deg(q.number("ha")) });
    const [t, ρ] = [figures.length(q.thickness), figures.density(density)];
    return [
      {
        answers: [
          { label: "Mass of the sheet", kind: "mass", value: weight, formula: { text: "m = w · d · t · ρ", of: { w: figures.length(q.number("w")), d: figures.length(q.number("d")), t, ρ } }, source: `nominal thickness; density of ${q.material.id}` },
          { label: "Area that weighs 23 kg", kind: "area", value: onePersonArea(q.thickness, density), formula: { text: "A = [m | ρ · t]", of: { m: figures.mass(LOAD_CONSTANT_KG), ρ, t } }, source: "NIOSH load constant, before its multipliers" },
        ],
      },
      {
        title: "One person's limit",
        answers: [{
          label: "Recommended weight limit", kind: "mass", value: limit,
          formula: { text: "RWL = m_c · HM · VM · DM · AM", of: { m_c: figures.mass(LOAD_CONSTANT_KG), HM: figures.ratio(horizontal), VM: figures.ratio(vertical), DM: figures.ratio(distance), AM: figures.ratio(asymmetry) } },
          source: "NIOSH lifting equation; constant seen, equation and bounds from memory", note: `British HSE guide, second-hand: men ${HSE_GUIDE_KG.men} kg, women ${HSE_GUIDE_KG.women} kg. Advice only: local rules decide.`,
        }],
        ...(weight > limit ? { remark: { tone: "caution", text: "The sheet is over the limit for this lift: two people, a lifting aid or a support table. Gloves: edges cut." } } : {}),
      },
    ];
  },
};
