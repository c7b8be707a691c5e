import { aluminiumMinimumRadius } from "@/bending/handbook/aluminiumMinimumRadius";
import { en485MinimumRadius } from "@/bending/handbook/en485MinimumRadius";
import { lowCarbonMinimumRadius } from "@/bending/handbook/lowCarbonMinimumRadius";
import { minimumRadius } from "@/bending/handbook/minimumRadius";
import { radiusByReduction } from "@/bending/handbook/radiusByReduction";
import { softHardRadius } from "@/bending/handbook/softHardRadius";
import type { Answer, AnswerGroup } from "../answer";
import { figures } from "../figures";
import type { Question } from "../question";
import type { Section } from "../section";

/** Below which inside radius the sheet cracks. */
export const leastRadius: Section = {
  id: "least-radius", title: "Minimum inside radius", question: "How tight may this sheet be bent?", fields: ["q"], choices: ["grain", "temper", "family"], needs: ["t", "a"],
  answer: (q) => [
    { title: `For ${q.material.id}`, ...own(q) },
    {
      title: "Rough rules for families of metal",
      answers: [
        ...(["soft", "hard"] as const).map((condition): Answer => ({ label: `${q.choices.family}, ${condition}`, kind: "length", value: softHardRadius(q.choices.family, condition, q.thickness), formula: { text: "R = n · t", of: { n: figures.ratio(softHardRadius(q.choices.family, condition, q.thickness) / q.thickness), t: figures.length(q.thickness) } }, source: "Kalpakjian, from memory" })),
        { label: "By reduction of area", kind: "length", value: radiusByReduction(q.number("q"), q.thickness), ...(q.number("q") <= 50 ? { formula: { text: "R = ([50 | q] − 1) · t", of: { q: figures.ratio(q.number("q")), t: figures.length(q.thickness) } } } : {}), source: "Kalpakjian; not under 0" },
      ],
    },
  ],
};

function own(q: Question): Pick<AnswerGroup, "answers" | "remark"> {
  const t = figures.length(q.thickness);
  if (q.material.group === "steel") {
    const found = minimumRadius(q.material, q.thickness, q.angle, q.choices.grain === "along");
    const low = lowCarbonMinimumRadius(q.thickness);
    return {
      answers: [
        ...(found ? [{ label: "Smallest inside radius", kind: "length", value: found.radius, source: found.source } as const] : []),
        { label: "Low-carbon steel", kind: "length", value: low, ...(low > 0.8 ? { formula: { text: "R = 0.5 · t", of: { t } } } : {}), source: "design guide: half the thickness or 0.80 mm, whichever is larger" },
      ],
      ...(found ? {} : { remark: { tone: "note", text: "DIN 6935's table ends at 20 mm and at a tensile strength of 640 MPa." } as const }),
    };
  }
  if (q.material.group !== "aluminium") return { answers: [], remark: { tone: "note", text: `No table for ${q.material.group} is at hand. The rough rules below give an idea; the mill's data sheet decides.` } };
  const [table, en] = [aluminiumMinimumRadius(q.choices.temper, q.thickness), en485MinimumRadius(q.thickness)];
  return {
    answers: [
      ...(table ? [{ label: `Aluminium ${q.choices.temper}`, kind: "length", value: table.radius, formula: { text: "R = n · t", of: { n: figures.ratio(table.timesThickness), t } }, source: table.source, ...(table.betweenColumns ? { note: "Between two columns: the thicker one is used." } : {}) } as const] : []),
      ...(en === null ? [] : [{ label: "EN AW-5052, H22 and H32", kind: "length", value: en, formula: { text: "R = n · t", of: { n: figures.ratio(en / q.thickness), t } }, source: "EN 485-2, second-hand" } as const]),
    ],
  };
}
