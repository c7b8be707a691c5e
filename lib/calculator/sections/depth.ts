import type { Rad, Mm } from "@/bending/core/units";
import { toDeg } from "@/bending/core/units";
import { punchTravel } from "@/bending/handbook/punchTravel";
import { springback } from "@/bending/handbook/springback";
import type { Answer } from "../answer";
import { bendFigures } from "../bendFigures";
import { bothReadings, type Reading } from "../bothReadings";
import { figures } from "../figures";
import type { Question } from "../question";
import type { Section } from "../section";

const MOST = 170;

/** Punch travel from contact with the flat sheet, for both ways of naming the V. */
export const depth: Section = {
  id: "depth", title: "Punch depth against angle", question: "How deep does the punch go for this angle?", fields: ["sh", "da", "re"], choices: ["vm"], needs: ["t", "a", "v", "r"],
  answer: (q) => (q.degrees > MOST ? [{ answers: [], remark: { tone: "caution", text: `A V makes no bend of over ${MOST}°; type a smaller bend angle.` } }] : bothReadings(q).map((reading) => {
    const back = springback(q.angle, q.insideRadius, q.thickness, q.material);
    return {
      title: reading.title,
      ...(wingIsLeft(q, reading) ? {} : { remark: { tone: "caution", text: "The radius is too large for this V: no straight sheet is left on the shoulders at this angle, so the depth does not hold. Take a wider V." } as const }),
      answers: [
        ...reading.conversion,
        travel("Depth D at the bend angle, without springback", q, reading, q.angle, q.insideRadius),
        travel("Depth D at the demanded angle, so that it springs back to the bend angle", q, reading, back.angle, back.radius),
        { label: "The plain form, radii left out", kind: "length", value: (reading.tops / 2) * Math.tan(q.angle / 2), formula: { text: "D_0 = [V | 2] · tan([α | 2])", of: { V: figures.length(reading.tops), α: bendFigures(q).α } }, source: "trade's simple form" },
      ],
    };
  })),
};

/** Between the outside arc and the shoulder arc some straight sheet has to be left. */
const wingIsLeft = (q: Question, { die, tops }: Reading): boolean => (q.insideRadius + q.thickness + die.shoulderRadius) * Math.sin(q.angle / 2) < tops / 2;

function travel(label: string, q: Question, { die, tops }: Reading, angle: Rad, inside: Mm): Answer {
  const of = { V: figures.length(tops), α: figures.angle(toDeg(angle)), R: figures.length(inside), t: figures.length(q.thickness), r_d: figures.length(die.shoulderRadius) };
  return {
    label, kind: "length", value: punchTravel(angle, inside, q.thickness, die),
    formula: { text: "D = [V | 2] · tan([α | 2]) − (R + t + r_d) · ([1 | cos(α / 2)] − 1)", of },
    source: "derived from the tangencies and checked by sampling; from contact with the flat sheet; no stretch of the brake, V between the arc tops, punch nose not over R",
  };
}
