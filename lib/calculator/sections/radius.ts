import { naturalRadius } from "@/bending/handbook/naturalRadius";
import { radiusByRule } from "@/bending/handbook/radiusByRule";
import { radiusRules } from "@/bending/handbook/radiusRules";
import { sharpBendLimit } from "@/bending/handbook/sharpBendLimit";
import { tensileScaledRadius } from "@/bending/handbook/tensileScaledRadius";
import { MILD_STEEL_US } from "@/bending/handbook/forceForms";
import { formatNumber } from "@/lib/format/formatNumber";
import { bendFigures } from "../bendFigures";
import { figures } from "../figures";
import type { Section } from "../section";

/** The inside radius that a V gives by itself. */
export const radius: Section = {
  id: "radius", title: "Natural inside radius", question: "Which inside radius does this V give in air bending?", fields: [], choices: [], needs: ["t", "v", "rm"],
  answer: (q) => {
    const { V, t, R_m } = bendFigures(q);
    const [natural, sharp] = [naturalRadius(q.material, q.vOpening), sharpBendLimit(q.thickness)];
    return [
      {
        answers: [
          { label: `Natural radius, ${q.material.id}`, kind: "length", value: natural, formula: { text: "R = c · V", of: { c: figures.ratio(q.material.naturalRadiusRatio), V } }, source: `the material's part of the V; ${q.material.group}: trade charts and magazines` },
          { label: "Scaled by tensile strength", kind: "length", value: tensileScaledRadius(q.tensile, q.vOpening), formula: { text: "R = 0.156 · [R_m | R_0] · V", of: { V, R_m, R_0: figures.stress(MILD_STEEL_US) } }, source: "form from The FABRICATOR's cases, its constant fitted to two of them; measured radii differ" },
          { label: "Sharp below", kind: "length", value: sharp, formula: { text: "R_s = 0.63 · t", of: { t } }, source: "about 63 % of the thickness, carbon steel (The FABRICATOR)" },
        ],
        ...(natural < sharp ? { remark: { tone: "caution", text: "The V is narrow: the bend turns sharp, the punch creases the sheet and the angle scatters." } } : {}),
      },
      {
        title: "Rules in print",
        answers: radiusRules.map((rule) => {
          const [low, high] = radiusByRule(rule, q.vOpening);
          return { label: `${rule.material}, ${ratioText(rule.ratio)} V`, kind: "length", value: low, ...(high > low ? { upTo: high } : {}), formula: { text: "R = c · V", of: { c: figures.ratio(rule.ratio[0]), V } }, source: rule.source };
        }),
      },
    ];
  },
};

/** 0.167, or 0.2 to 0.22. */
const ratioText = (ratio: readonly [number, number]): string => [...new Set(ratio)].map((part) => formatNumber(part, 4)).join(" to ");
