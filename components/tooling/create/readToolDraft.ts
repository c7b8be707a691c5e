import type { FieldProblem } from "@/bending/core/problem";
import { fail, ok, type Result } from "@/bending/core/result";
import { readToolingDocument } from "@/bending/tooling/readToolingDocument";
import { parseAngle } from "@/lib/format/parseAngle";
import { parseLength } from "@/lib/format/parseLength";
import { parseNumber } from "@/lib/format/parseNumber";
import type { ToolInput } from "@/lib/schemas/toolInputs";
import { parseProfile } from "./parseProfile";
import type { ToolDraft } from "./toolDraft";

/** What was typed as the API wants it, or everything that is wrong, by field of the API. */
export function readToolDraft(draft: ToolDraft): Result<ToolInput, readonly FieldProblem[]> {
  const problems: FieldProblem[] = [];
  const take = (path: string, read: Result<number, string>): number => {
    if (read.ok) return read.value;
    problems.push({ path, message: read.error });
    return 0;
  };
  const profile = parseProfile(draft.profile);
  if (!profile.ok) problems.push({ path: "profile", message: profile.error });
  const common = {
    profile: profile.ok ? profile.value : [],
    height: take("height", parseLength(draft.height, "mm")),
    maxForcePerMetre: take("maxForcePerMetre", parseNumber(draft.rating)),
    tang: draft.tang.trim(),
  };
  const own = draft.kind === "punch"
    ? { kind: draft.kind, tipAngle: take("tipAngle", parseAngle(draft.angle)), tipRadius: take("tipRadius", parseLength(draft.radius, "mm")) }
    : { kind: draft.kind, vAngle: take("vAngle", parseAngle(draft.angle)), shoulderRadius: take("shoulderRadius", parseLength(draft.radius, "mm")), vOpening: take("vOpening", parseLength(draft.vOpening, "mm")), ...(draft.flattens ? { flattening: slot(draft, take) } : {}) };
  if (problems.length > 0) return fail(problems);
  const name = draft.name.trim() === "" ? {} : { name: draft.name.trim() };
  const read = readToolingDocument({ format: "tooling/1", units: "mm", tools: [{ id: draft.code.trim(), ...name, ...common, ...own, sections: [] }] });
  if (!read.ok) return fail(read.error.map(({ path, message }) => ({ path: path.replace(/^tools\[0\]\.?/, "").replace(/^id$/, "code"), message })));
  return ok({ code: draft.code.trim(), units: "mm", ...name, ...common, ...own });
}

const slot = (draft: ToolDraft, take: (path: string, read: Result<number, string>) => number) => ({
  floor: take("flattening.floor", parseLength(draft.slotFloor, "mm")),
  back: take("flattening.back", parseNumber(draft.slotBack)),
  opening: take("flattening.opening", parseLength(draft.slotOpening, "mm")),
});
