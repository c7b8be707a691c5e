import { flangeWithMargin } from "../handbook/flangeWithMargin";
import type { Bend, Face } from "../part/partModel";
import type { BendingV } from "./bendTools";
import type { FindingsContext } from "./context";
import { faceReach } from "../part/faceReach";
import type { Finding } from "./finding";
import { lengthCure } from "./lengthCure";
import { shownLength } from "./shownLength";

const SOURCE = "minimum flange derived from the die's two tangencies; margin by the trade chart of 0.70 V to 0.77 V";
/** mm. A hundredth of what a gauge repeats. */
const ENOUGH_MM = 1e-3;

/** A face as the die would hold it while one of its bends is made last. */
interface Held {
  readonly bend: Bend;
  readonly reach: number;
  /** For each V that can make the bend, the reach that touches its shoulder, and the usual one. */
  readonly needs: readonly { readonly v: BendingV; readonly contact: number; readonly advised: number }[];
}

/**
 * Faces that are too short for every V. Whichever bend of a face is made last sees the face alone, as everything beyond
 * it is bent away by then; so at least one of its bends must hold it. A flap that becomes a hem may be flattened last and
 * lengthens the face until then.
 */
export function shortFlanges(context: FindingsContext): readonly Finding[] {
  return context.part.faces.flatMap((face, index) => {
    const held = heldBy(context, face, index);
    if (held.length === 0) return [];
    const findings = held.map((one) => judge(context, face, one));
    // One bend that holds it well is enough.
    if (findings.some((finding) => finding === null)) return [];
    const [least] = findings.filter((finding) => finding !== null).sort((a, b) => RANK[a.severity] - RANK[b.severity] || lack(a) - lack(b));
    return least ? [least] : [];
  });
}

const RANK = { note: 0, caution: 1, stop: 2 } as const;
const lack = ({ measure }: Finding) => (measure ? measure.wanted - measure.value : 0);

function heldBy({ part, bendsOn, toolsOf }: FindingsContext, face: Face, index: number): readonly Held[] {
  const on = (bendsOn[index] ?? []).flatMap((i) => part.bends[i] ?? []);
  const flaps = on.filter(({ hem, child }) => hem !== null && child !== index).flatMap(({ child }) => part.faces[child]?.outline ?? []);
  // A hem is flattened and an offset pressed in one stroke: the rule of the V is not theirs.
  return on.filter(({ hem, strokeWith }) => hem === null && strokeWith === null).flatMap((bend): readonly Held[] => {
    const { fitting } = toolsOf(bend);
    if (fitting.length === 0) return [];
    const half = bend.angle / 2;
    // From the apex of the outside surfaces to the bend line, measured in the sheet.
    const toLine = (bend.insideRadius + part.thickness) * Math.tan(half) - bend.allowance / 2;
    const needs = fitting.map((v) => {
      const { contact, advised } = flangeWithMargin(bend.angle, { measured: "between-tops", opening: v.vOpening, shoulderRadius: v.shoulderRadius });
      return { v, contact: Math.max(v.vOpening / 2, contact - toLine), advised: Math.max(v.vOpening / 2, advised - toLine) };
    });
    return [{ bend, reach: faceReach([...face.outline, ...flaps], bend), needs }];
  });
}

/** What is to be said of a face that this bend would hold last; null when nothing is. */
function judge(context: FindingsContext, face: Face, { bend, reach, needs }: Held): Finding | null {
  const enough = (need: number) => reach >= need - ENOUGH_MM;
  const least = [...needs].sort((a, b) => a.advised - b.advised)[0];
  const usual = needs.find(({ v }) => v.die === context.toolsOf(bend).nearest?.die);
  if (!least || !usual || enough(usual.advised)) return null;
  const good = needs.filter(({ advised }) => enough(advised));
  const touching = needs.filter(({ contact }) => enough(contact));
  const severity = good.length > 0 ? "note" : touching.length > 0 || context.shop === null ? "caution" : "stop";
  const wanted = good.length > 0 ? usual : least;
  const length = lengthOf(context, face, bend);
  const now = length?.mm ?? reach;
  const add = now - reach;
  const say = (mm: number) => shownLength(mm, context.units, "up");
  const vName = ({ v }: { readonly v: BendingV }) => (v.die === null ? `the usual V of ${shownLength(v.vOpening, context.units)}` : `${v.die} (V ${shownLength(v.vOpening, context.units)})`);
  const begins = `${face.bend === null ? "The base" : `Flange ${face.id}`} is ${shownLength(now, context.units)} long${length ? "" : " from the bend line, in the flat"}.`;
  const rest = severity === "note"
    ? `It can be bent over ${good.map(vName).join(" or ")} only; ${vName(usual)}, which is nearest to the usual V, needs ${say(usual.advised + add)}.`
    : severity === "caution" && touching.length > 0
      ? `It touches the shoulder of ${touching.map(vName).join(" or ")} with too little to spare; ${say(least.advised + add)} is usual for ${vName(least)}.`
      : `${upper(vName(least))} holds it from ${say(least.contact + add)} on, and ${say(least.advised + add)} is usual${context.shop === null ? "" : "; no die of the shop that fits this bend needs less"}.`;
  return {
    key: `${severity === "note" ? "narrow-v" : "flange"} ${face.id}`,
    rule: severity === "note" ? "narrow-v" : "flange",
    severity,
    title: severity === "note" ? "Only a narrow V holds it" : "Flange too short",
    message: `${begins} ${rest}`,
    source: SOURCE,
    faces: [face.id],
    bends: [bend.id],
    paths: length ? [length.path] : [],
    marks: [{ kind: "region", outline: face.outline }, { kind: "line", from: bend.line[0], to: bend.line[1] }],
    measure: { value: now, wanted: wanted.advised + add, unit: "mm" },
    cure: length ? lengthCure(length.path, wanted.advised + add, "up", context.units) : null,
  };
}

const upper = (text: string) => text.charAt(0).toUpperCase() + text.slice(1);

/** The field that makes the face longer away from this bend, when one does so one for one. */
function lengthOf({ fields, part }: FindingsContext, face: Face, bend: Bend): { readonly path: string; readonly mm: number } | null {
  if (face.bend === null) return fields.baseLength;
  const own = part.bends[face.bend];
  if (!own) return null;
  const parallel = Math.abs(cross(own, bend)) < 1e-6;
  return parallel ? (fields.ofBend.get(own.id)?.length ?? null) : null;
}

function cross({ line: [a, b] }: Bend, { line: [c, d] }: Bend): number {
  const [ux, uy, vx, vy] = [b[0] - a[0], b[1] - a[1], d[0] - c[0], d[1] - c[1]];
  return (ux * vy - uy * vx) / (Math.hypot(ux, uy) * Math.hypot(vx, vy));
}
