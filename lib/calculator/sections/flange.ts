import { flangeWithMargin } from "@/bending/handbook/flangeWithMargin";
import { bendFigures } from "../bendFigures";
import { bothReadings } from "../bothReadings";
import { figures } from "../figures";
import type { Section } from "../section";

/** From here on the sheet would have to pass through the punch. */
const MOST = 170;

/** Shortest flange over a V, by geometry and with the chart's margin. */
export const flange: Section = {
  id: "flange", title: "Minimum flange", question: "How short may a flange be over this V?", fields: ["sh", "da"], choices: ["vm"], needs: ["t", "a", "v"],
  answer: (q) => (q.degrees > MOST ? [{ answers: [], remark: { tone: "caution", text: `A V makes no bend of over ${MOST}°; type a smaller bend angle.` } }] : bothReadings(q).map(({ die, title, tops, conversion }) => {
    const need = flangeWithMargin(q.angle, die);
    const [α, V, r_d] = [bendFigures(q).α, figures.length(tops), figures.length(die.shoulderRadius)];
    return {
      title,
      answers: [
        ...conversion,
        { label: "Touches the shoulder, nothing to spare", kind: "length", value: need.contact, formula: { text: "b = [V | 2 · cos(α / 2)] − r_d · tan([α | 2])", of: { α, V, r_d } }, source: "exact by geometry, to the outside apex; V between the arc tops; any radius and thickness" },
        { label: "With the chart's margin", kind: "length", value: need.advised, formula: { text: "b_m = b + m", of: { b: figures.length(need.contact), m: figures.length(need.margin) } }, source: "trade chart, 0.70 V to 0.77 V at 90°; its margin carried to other angles by common practice, no source" },
        { label: "Flat sheet on each side before the stroke", kind: "length", value: need.halfBlank, formula: { text: "c = [V | 2]", of: { V } }, source: "the sheet must lie on both shoulders" },
      ],
    };
  })),
};
