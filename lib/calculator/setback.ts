import { outsideSetback } from "@/bending/handbook/outsideSetback";
import type { Answer } from "./answer";
import { bendFigures } from "./bendFigures";
import type { Question } from "./question";

/** Outside setback as an answer: to the apex up to 90 degrees, to the outermost tangent above. */
export function setbackAnswer(q: Question): Answer {
  const { α, R, t } = bendFigures(q);
  const acute = q.degrees > 90;
  return {
    label: "Outside setback SB", kind: "length", value: outsideSetback(q.angle, q.insideRadius, q.thickness),
    formula: acute ? { text: "SB = R + t", of: { R, t } } : { text: "SB = (R + t) · tan([α | 2])", of: { α, R, t } },
    source: acute ? "DIN 6935: over 90° turned through, legs run to the outermost tangent" : "FAA-H-8083-31 ch. 4; general sheet-metal texts",
  };
}
