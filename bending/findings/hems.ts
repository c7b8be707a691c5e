import { hemSteps } from "../handbook/hemSteps";
import { bendLines } from "./bendLines";
import type { FindingsContext } from "./context";
import { faceReach } from "../part/faceReach";
import type { Finding } from "./finding";
import { lengthCure } from "./lengthCure";
import { named } from "./named";
import { shownLength } from "./shownLength";

const SOURCE = "hems by stamping and press-brake guides";
const RETURN_SOURCE = "return of a hem at least four thicknesses (from memory)";

/** Hems that the shop cannot flatten, and hems whose return is too short to be flattened well. */
export function hems(context: FindingsContext): readonly Finding[] {
  const { part, shop } = context;
  const all = part.bends.filter(({ hem }) => hem !== null);
  if (all.length === 0) return [];
  const ids = all.map(({ id }) => id);
  const [opening] = hemSteps(part.thickness).preBendOpening;
  const tool: readonly Finding[] = shop && shop.flattening.length === 0 ? [{
    key: "hem-tool",
    rule: "hem-tool",
    severity: "stop",
    title: "No tool flattens the hem",
    message: `${named("Hem", ids)} ${ids.length > 1 ? "are" : "is"} pre-bent to about ${opening}° included and then flattened; the shop has no flattening tool in service.`,
    source: SOURCE,
    faces: [],
    bends: ids,
    paths: all.flatMap(({ id }) => context.fields.ofBend.get(id)?.path ?? []).map((path) => `${path}.hem`),
    marks: bendLines(all),
    measure: null,
    cure: null,
  }] : [];
  return [...tool, ...all.flatMap((bend): readonly Finding[] => {
    const face = part.faces[bend.child];
    if (!face) return [];
    const { returnLength } = hemSteps(part.thickness);
    // From the outermost tangent of the bend, as a leg over 90 degrees is measured.
    const now = faceReach(face.outline, bend) - bend.allowance / 2 + bend.insideRadius + part.thickness;
    if (now >= returnLength - 1e-6) return [];
    const field = context.fields.ofBend.get(bend.id)?.length ?? null;
    const wanted = field ? field.mm + returnLength - now : returnLength;
    return [{
      key: `hem-return ${bend.id}`,
      rule: "hem-return",
      severity: "caution",
      title: "Hem too narrow",
      message: `The return of hem ${bend.id} is ${shownLength(now, context.units)} wide; ${shownLength(returnLength, context.units)}, four thicknesses, is the least that flattens well.`,
      source: RETURN_SOURCE,
      faces: [face.id],
      bends: [bend.id],
      paths: field ? [field.path] : [],
      marks: [{ kind: "region", outline: face.outline }],
      measure: { value: now, wanted: returnLength, unit: "mm" },
      cure: field ? lengthCure(field.path, wanted, "up", context.units) : null,
    }];
  })];
}
