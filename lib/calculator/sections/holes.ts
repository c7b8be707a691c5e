import { mm } from "@/bending/core/units";
import { holeOverDie } from "@/bending/handbook/holeOverDie";
import { holeToBend, type PiercedFeature } from "@/bending/handbook/holeToBend";
import { minimumCurlRadius } from "@/bending/handbook/minimumCurlRadius";
import { reliefSize } from "@/bending/handbook/reliefSize";
import { bendFigures } from "../bendFigures";
import { figures } from "../figures";
import type { Section } from "../section";

/** What must keep away from a bend. */
export const holes: Section = {
  id: "holes", title: "Holes and reliefs", question: "How near may a hole be, and how large is a relief?", fields: ["sl", "he"], choices: ["hole"], needs: ["t", "v", "r"],
  answer: (q) => {
    const { R, t } = bendFigures(q);
    const feature: PiercedFeature = q.choices.hole === "slot" ? { kind: "slot", length: mm(q.number("sl")) } : { kind: q.choices.hole };
    const distance = holeToBend(feature, q.thickness, q.insideRadius);
    const times = (value: number) => figures.ratio((value - q.insideRadius) / q.thickness);
    const relief = reliefSize(q.thickness, q.insideRadius);
    const over = holeOverDie(mm(q.number("he")), q.vOpening);
    return [
      {
        title: `${q.choices.hole.charAt(0).toUpperCase()}${q.choices.hole.slice(1)}, its edge to the inside of the bend`,
        answers: [
          { label: "At least", kind: "length", value: distance.least, formula: { text: "d = n · t + R", of: { n: times(distance.least), t, R } }, source: distance.source },
          { label: "By the more cautious guide", kind: "length", value: distance.cautious, formula: { text: "d = n · t + R", of: { n: times(distance.cautious), t, R } }, source: distance.source },
          { label: "Free of the V's opening from", kind: "length", value: q.vOpening / 2, formula: { text: "e = [V | 2]", of: { V: figures.length(q.vOpening) } }, source: "edge to bend line; from memory" },
        ],
        remark: over ? { tone: "caution", text: "This hole lies over the V's opening: it pulls out of shape. Take a narrower V, or pierce it after bending." } : { tone: "note", text: "This hole lies clear of the V's opening." },
      },
      {
        title: "Relief and curl",
        answers: [
          { label: "Relief width", kind: "length", value: relief.width[0], upTo: relief.width[1], formula: { text: "w = t", of: { t } }, source: "from memory; some take 1.5 t" },
          { label: "Relief depth past the bend line's outer edge", kind: "length", value: relief.depth[0], upTo: relief.depth[1], formula: { text: "d = R + t", of: { R, t } }, source: "from memory; some add half a millimetre" },
          { label: "Least radius of a curled edge", kind: "length", value: minimumCurlRadius(q.thickness), formula: { text: "R_c = 2 · t", of: { t } }, source: "stamping design guides" },
        ],
      },
    ];
  },
};
