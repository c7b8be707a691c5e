import { kiloNewton, kiloNewtonPerMetre, mm } from "@/bending/core/units";
import { airBendForces } from "@/bending/handbook/airBendForces";
import { FORCE_V_RANGE } from "@/bending/handbook/airBendForce";
import { bendingWork } from "@/bending/handbook/bendingWork";
import { forceByMethod } from "@/bending/handbook/forceByMethod";
import { forceForms, type ForceForm } from "@/bending/handbook/forceForms";
import { methodForceRange } from "@/bending/handbook/methodForceRange";
import { publishedForce } from "@/bending/handbook/publishedForce";
import { punchTravel } from "@/bending/handbook/punchTravel";
import type { Answer, Formula } from "../answer";
import { bendFigures } from "../bendFigures";
import { figures } from "../figures";
import type { Question } from "../question";
import type { Section } from "../section";

/** The three that `airBendForces` puts side by side. */
const three = ["groover", "trade-1.42", "oehler"];
const forms = forceForms.filter(({ operation }) => operation === "v-die");
const labels: Readonly<Record<string, string>> = { "kalpakjian-low": "Kalpakjian, lower end", groover: "Groover", "trade-1.42": "Trade formula, 1.42", "trade-650": "Trade formula, 650", "trade-575": "Trade rule, 575", oehler: "Oehler" };
const percent = (part: number): string => `${Math.round(part * 100)} %`;

/** Force of one stroke by the published forms, and by method. */
export const force: Section = {
  id: "force",
  title: "Force",
  question: "What does the stroke need, and how far do the published forms part?",
  fields: ["fb", "fc", "sh", "da"], choices: ["vm"], needs: ["t", "a", "v", "l", "rm", "r"],
  answer: (q) => {
    const { spread } = airBendForces(q.tensile, q.thickness, q.vOpening);
    const oehler = forms.find(({ id }) => id === "oehler");
    const perMetre = oehler ? publishedForce(oehler, q.tensile, q.thickness, q.vOpening) : kiloNewtonPerMetre(NaN);
    const ratio = q.vOpening / q.thickness;
    const outside = ratio < FORCE_V_RANGE[0] || ratio > FORCE_V_RANGE[1];
    return [
      {
        title: `Air bending, three published forms: ${percent(spread)} apart`, answers: three.flatMap((id) => forms.filter((form) => form.id === id)).map((form) => answerOf(form, q)),
        ...(outside ? { remark: { tone: "caution", text: `The V is ${Math.round(ratio * 10) / 10} times the thickness; Oehler's form holds from 5 to 20 times.` } } : {}),
      },
      { title: "Other forms in print", answers: forms.filter(({ id }) => !three.includes(id)).map((form) => answerOf(form, q)) },
      {
        title: "By method, from Oehler's force", answers: [byMethod("bottoming", q, perMetre), byMethod("coining", q, perMetre), work(q, perMetre)],
        remark: { tone: "note", text: "Published factors of bottoming and coining disagree by more than two times: take the shop's own where it has measured." },
      },
    ];
  },
};

const metres = (q: Question): number => q.number("l") / 1000;

function answerOf(form: ForceForm, q: Question): Answer {
  return { label: labels[form.id] ?? form.source, kind: "force", value: publishedForce(form, q.tensile, q.thickness, q.vOpening) * metres(q), formula: formulaOf(form, q), source: `${form.source}; printed as ${form.formula}` };
}

function formulaOf(form: ForceForm, q: Question): Formula {
  const { t, V, R_m } = bendFigures(q);
  const of = { t, V, R_m, l: figures.length(q.number("l")) };
  return form.perRatio > 0
    ? { text: "F = (1 + 4 · [t | V]) · [R_m · t² · l | V]", of }
    : { text: "F = c · [R_m · t² · l | V]", of: { ...of, c: figures.ratio(form.factor) } };
}

function byMethod(method: "bottoming" | "coining", q: Question, perMetre: ReturnType<typeof kiloNewtonPerMetre>): Answer {
  const range = methodForceRange(perMetre, method);
  const said = (value: number) => Math.round(value / perMetre * 10) / 10;
  return {
    label: method === "bottoming" ? "Bottoming" : "Coining", kind: "force", value: forceByMethod(perMetre, method, q.factors) * metres(q),
    formula: { text: "F_m = f · F", of: { f: figures.ratio(q.factors[method]), F: figures.force(perMetre * metres(q)) } },
    source: "factor of trade pages, or the shop's own", note: `Factors in print: ${said(range.lowest)} to ${said(range.highest)} times air.`,
  };
}

function work(q: Question, perMetre: number): Answer {
  const [whole, travel] = [kiloNewton(perMetre * metres(q)), mm(Math.max(0, punchTravel(q.angle, q.insideRadius, q.thickness, q.die)))];
  return {
    label: "Work of one stroke, air", kind: "work", value: bendingWork(whole, travel), formula: { text: "W = F · h · m", of: { F: figures.force(whole), h: figures.length(travel), m: figures.ratio(0.75) } },
    source: "Oehler, quoted with Lange, Umformtechnik vol. 3, 1990; m is 0.6 to 0.9", note: "h is the punch's travel of the section on depth.",
  };
}
